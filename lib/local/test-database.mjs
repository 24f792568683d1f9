// node lib/local/test-database.mjs up|down: the tests' database for someone running single test files by hand.
import { join } from "node:path";
import { Refusal, runMain } from "./refusal.mjs";
import { lowerTestCluster, raiseTestCluster } from "./test-cluster.mjs";

const root = join(import.meta.dirname, "..", "..");

await runMain(async () => {
  const wish = process.argv[2];
  if (wish === "up") {
    const { url } = await raiseTestCluster(root);
    console.log(url);
  } else if (wish === "down") {
    const stopped = await lowerTestCluster(root);
    console.log(stopped ? "The test database is stopped." : "The test database was not running.");
  } else {
    throw new Refusal("Say what to do: node lib/local/test-database.mjs up, or down.");
  }
});
