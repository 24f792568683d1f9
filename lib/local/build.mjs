import { existsSync, mkdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { dirname, join, relative } from "node:path";
import { step } from "./progress.mjs";
import { stampOf } from "./stamps.mjs";
import { mustRun } from "./task.mjs";

const SOURCES = [
  "app",
  "components",
  "lib",
  "render",
  "db/enums.ts",
  "db/client.ts",
  "db/schema",
  "public",
  "proxy.ts",
];
const CONFIGURATION = [
  "package-lock.json",
  "next.config.mjs",
  "tsconfig.json",
  "postcss.config.mjs",
  "tailwind.config.ts",
];

/** The launcher and the demonstration run beside the web app, not in it. @param {string} path */
const isBuiltFrom = (path) => !path.startsWith("lib/local/") && !path.startsWith("lib/demo/");

/**
 * Builds the web app when its sources differ from those of the last whole build.
 * @param {import("./task.mjs").TaskContext} context
 * @param {string} distDir relative to the repository
 * @param {string} logFile
 */
export async function ensureWebBuild(context, distDir, logFile) {
  const built = join(context.cwd, distDir);
  const stampFile = join(built, "ringwright-stamp");
  const stamp = stampOf(context.cwd, [...SOURCES, ...CONFIGURATION], isBuiltFrom);
  const last =
    existsSync(stampFile) && existsSync(join(built, "BUILD_ID")) ? readFileSync(stampFile, "utf8") : "";
  if (last === stamp) return;
  rmSync(stampFile, { force: true });
  if (distDir !== ".next") writeOwnTsconfig(context.cwd, dirname(built));
  /** @type {import("./task.mjs").TaskContext} */
  const build = {
    ...context,
    env: { ...process.env, NODE_ENV: "production", NEXT_DIST_DIR: distDir, NEXT_TELEMETRY_DISABLED: "1" },
  };
  const command = [process.execPath, "node_modules/next/dist/bin/next", "build"];
  await step(
    "The web app is built",
    () => mustRun(build, command, "The web app could not be built", logFile),
    "Building the web app: about half a minute, after each change of its sources.",
  );
  writeFileSync(stampFile, stamp);
}

/** next.config.mjs looks for it beside any build but the usual one. @param {string} root @param {string} folder */
function writeOwnTsconfig(root, folder) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(
    join(folder, "tsconfig.json"),
    JSON.stringify({ extends: relative(folder, join(root, "tsconfig.json")) }),
  );
}

/**
 * Builds the sky file from the star catalogue when it is missing or older than the script that makes it.
 * @param {import("./task.mjs").TaskContext} context
 * @param {string} logFile
 */
export async function ensureSky(context, logFile) {
  const script = join("lib", "local", "build-sky.ts");
  const sky = join(context.cwd, "public", "sky", "stars.bin");
  if (existsSync(sky) && statSync(sky).mtimeMs >= statSync(join(context.cwd, script)).mtimeMs) return;
  await step("The star file is built", () =>
    mustRun(
      context,
      [process.execPath, "--import", "tsx", script],
      "The star file could not be built",
      logFile,
    ),
  );
}
