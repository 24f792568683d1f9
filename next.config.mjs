import { join } from "node:path";

// `npm test` builds beside the build being served: into a folder of its own, with a tsconfig of its own beside it,
// because Next writes the names of its type folders into whichever it is given.
const distDir = process.env.NEXT_DIST_DIR ?? ".next";
const tsconfigPath = distDir === ".next" ? "tsconfig.json" : join(distDir, "..", "tsconfig.json");

/** @type {import("next").NextConfig} */
const config = {
  distDir,
  // `npm run verify` checks the types; a build need not do it again.
  typescript: { tsconfigPath, ignoreBuildErrors: true },
  poweredByHeader: false,
  reactStrictMode: true,
  serverExternalPackages: ["bullmq", "pg", "@node-rs/argon2", "sharp", "pino", "piscina"],
  turbopack: { root: import.meta.dirname },
};

export default config;
