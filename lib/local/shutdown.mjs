/**
 * Collects what has to be stopped and stops it, last started first: web, worker, mail, database.
 * Ctrl-C and SIGTERM abort `signal`; a second one changes nothing, because stopping is already under way.
 */
export function prepareShutdown() {
  const controller = new AbortController();
  /** @type {(() => Promise<unknown>)[]} */
  const stops = [];
  for (const name of /** @type {const} */ (["SIGINT", "SIGTERM", "SIGHUP"])) {
    process.on(name, () => controller.abort());
  }
  return {
    signal: controller.signal,
    /** @param {() => Promise<unknown>} stop */
    onStop: (stop) => void stops.push(stop),
    /** Ends the wait from inside, as a signal does from outside. */
    end: () => controller.abort(),
    /** Answers once a signal has come, or `end` was called. @returns {Promise<void>} */
    waitForSignal: () =>
      new Promise((resolve) => {
        // A pending promise alone does not keep Node running.
        const awake = setInterval(() => undefined, 60_000);
        const finish = () => (clearInterval(awake), resolve());
        if (controller.signal.aborted) finish();
        controller.signal.addEventListener("abort", finish, { once: true });
      }),
    stopAll: async () => {
      for (const stop of stops.splice(0).reverse()) await stop();
    },
  };
}
