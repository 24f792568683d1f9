// npm run verify: what can be checked without any service, in seconds.
import { runMain } from "./refusal.mjs";
import { runVerify } from "./verify-steps.mjs";

await runMain(async () => {
  const { failed } = await runVerify();
  return failed === 0 ? 0 : 1;
});
