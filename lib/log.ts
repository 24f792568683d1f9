import pino from "pino";

/** The process's log: one JSON line an event, secrets struck out. */
export const log = pino({
  level: process.env.LOG_LEVEL ?? "info",
  redact: {
    paths: ["*.password", "*.token", "req.headers.cookie", "req.headers.authorization"],
    censor: "[struck out]",
  },
});
