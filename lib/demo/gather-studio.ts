import { randomInt } from "node:crypto";
import { existsSync, mkdirSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";
import { eq } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { people } from "@/db/schema/people";
import { loadActor } from "../auth/load-actor";
import type { Actor } from "../context";
import { addMember } from "../people/add-member";
import { createOwner, createPerson } from "../people/create-person";
import { addProduction } from "../productions/create";
import { cast, productions, studio } from "./story";

export type Part = keyof typeof cast;
export type Studio = Record<Part, Actor>;

const parts = Object.keys(cast) as Part[];
const syllables = [
  "ba",
  "de",
  "fi",
  "go",
  "hu",
  "ja",
  "ke",
  "li",
  "mo",
  "nu",
  "pa",
  "re",
  "si",
  "to",
  "vu",
  "za",
];

/** Twelve syllables to read aloud, 48 bits: enough for accounts that exist on one machine's loopback. */
function newPassword(): string {
  const word = () => Array.from({ length: 3 }, () => syllables[randomInt(syllables.length)]).join("");
  return Array.from({ length: 4 }, word).join("-");
}

/** The studio's people and productions, made at once or found as they were. */
export async function gatherStudio(db: Database): Promise<Studio> {
  const [anyone] = await db.select({ id: people.id }).from(people).limit(1);
  if (!anyone) await makePeople(db);
  const found = await Promise.all(parts.map((part) => findActor(db, part)));
  return Object.fromEntries(parts.map((part, index) => [part, found[index]])) as Studio;
}

async function makePeople(db: Database): Promise<void> {
  const accounts = parts.map((role) => ({ role, ...cast[role], password: newPassword() }));
  // Written first: should the machine stop between the two, the accounts can still be used.
  writeAccounts(accounts.map(({ role, name, email, password }) => ({ role, name, email, password })));
  await db.transaction(async (tx) => {
    const [owner, ...others] = accounts;
    const madeOwner = await createOwner(tx, { ...owner!, studio });
    const made = [];
    for (const person of others) made.push({ role: person.role, ...(await createPerson(tx, person)) });
    for (const { code, name, kind } of productions) {
      const production = await addProduction(tx, madeOwner, { code, name, kind });
      await fillProduction(tx, production.id, made);
    }
  });
}

async function fillProduction(
  tx: Transaction,
  productionId: string,
  made: { role: Part; id: string; name: string }[],
) {
  for (const { role, id, name } of made)
    if (role !== "owner") await addMember(tx, { productionId, person: { id, name }, role });
}

function writeAccounts(accounts: object[]): void {
  const file = process.env.DEMO_ACCOUNTS_FILE ?? ".data/demo-accounts.json";
  if (!existsSync(dirname(file))) mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, JSON.stringify(accounts, null, 2), { mode: 0o600 });
}

async function findActor(db: Database, part: Part): Promise<Actor> {
  const [row] = await db.select({ id: people.id }).from(people).where(eq(people.email, cast[part].email));
  const actor = row && (await loadActor(db, row.id));
  if (actor) return actor;
  throw new Error(
    `The demonstration was begun, but ${cast[part].email} is gone. Start with an empty database.`,
  );
}
