/** @type {import("next").NextConfig} */
const config = {
  poweredByHeader: false,
  reactStrictMode: true,
  serverExternalPackages: ["bullmq", "pg", "@node-rs/argon2", "sharp", "pino", "piscina"],
  turbopack: { root: import.meta.dirname },
};

export default config;
