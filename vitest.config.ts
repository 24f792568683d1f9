import react from "@vitejs/plugin-react";
import { defineConfig } from "vitest/config";

const alias = { "@": import.meta.dirname };

const node = (name: string, extra: object = {}) => ({
  resolve: { alias },
  test: {
    name,
    environment: "node" as const,
    include: [`tests/${name}/**/*.test.ts`],
    testTimeout: 60_000,
    // What tests provoke on purpose would drown what they find.
    env: { LOG_LEVEL: "silent" },
    ...extra,
  },
});

export default defineConfig({
  test: {
    projects: [
      node("render"),
      node("lib"),
      node("db", { fileParallelism: false, hookTimeout: 60_000 }),
      node("app", { fileParallelism: false, hookTimeout: 60_000 }),
      {
        plugins: [react()],
        resolve: { alias },
        test: {
          name: "components",
          environment: "jsdom" as const,
          include: ["tests/components/**/*.test.tsx"],
          setupFiles: ["tests/components/setup.ts"],
        },
      },
    ],
  },
});
