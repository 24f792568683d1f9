// Makes the demonstration studio when the database is empty, by the same verbs that people use and with really
// rendered frames. Begun and interrupted, it goes on where it stopped.
import { renderFrame } from "@/render/hosts/node/render-frame";
import { closePool } from "@/render/hosts/node/pool";
import { database } from "../database";
import { makeCancellations } from "../renders/cancellations";
import { storage } from "../storage/storage";
import { carryShot } from "./carry-shot";
import { gatherStudio } from "./gather-studio";
import { isFinished, markFinished } from "./progress";
import { productions } from "./story";

const say = (line: string) => process.stdout.write(`${line}\n`);
const db = database();

try {
  const state = await isFinished(db);
  if (state === "theirs") say("There is a studio already; no demonstration is made.");
  if (state === "finished") say("The demonstration studio is there.");
  if (state === "empty" || state === "begun") await makeStudio();
} finally {
  await closePool();
  await db.$client.end();
}

async function makeStudio(): Promise<void> {
  const started = performance.now();
  const studio = await gatherStudio(db);
  const shop = { db, store: storage(), renderFrame, stops: makeCancellations() };
  for (const production of productions)
    for (const sequence of production.sequences)
      for (const shot of sequence.shots) {
        await carryShot({ shop, studio, production, sequence }, shot);
        say(`  ${shot.code}: ${shot.fate}`);
      }
  await markFinished(db, studio.owner);
  say(`The demonstration studio was made in ${Math.round((performance.now() - started) / 1000)} s.`);
}
