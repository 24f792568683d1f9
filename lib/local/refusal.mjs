/** A reason to stop that the person at the keyboard can act on: printed as it stands, without a stack. */
export class Refusal extends Error {}

/**
 * Runs a command's main function; a Refusal is printed as one sentence, anything else with its stack.
 * @param {() => Promise<number | void>} main answers with the exit code, 0 when it answers nothing
 */
export async function runMain(main) {
  try {
    process.exitCode = (await main()) ?? 0;
  } catch (error) {
    console.error(error instanceof Refusal ? error.message : error);
    process.exitCode = 1;
  }
}
