// Imports run one way: app → components → lib → db, with render at the bottom. No exemptions.
const only = (name, from, allowed) => ({
  name,
  severity: "error",
  from: { path: from },
  to: { path: "^(app|components|lib|db|render|tests|drizzle)/", pathNot: allowed },
});

module.exports = {
  forbidden: [
    { name: "no-cycles", severity: "error", from: {}, to: { circular: true } },
    only("render-imports-nothing-of-ours", "^render/", "^render/"),
    only("db-imports-only-itself", "^db/", "^db/"),
    only("lib-imports-db-and-render", "^lib/", "^(lib|db|render)/"),
    only("components-import-schemas-and-render", "^components/", "^(components/|render/|lib/[^/]+/schema)"),
    only("app-imports-components-and-lib", "^app/", "^(app|components|lib)/"),
    {
      name: "no-orphans",
      severity: "error",
      from: {
        orphan: true,
        pathNot:
          "(^tests/|\\.d\\.ts$|^[^/]+\\.(ts|mjs|cjs)$|^app/.*(page|layout|route|error|not-found|loading)\\.tsx?$)",
      },
      to: {},
    },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    exclude: { path: "^(\\.next|\\.data|node_modules)/" },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.json" },
    enhancedResolveOptions: { extensions: [".ts", ".tsx", ".mjs", ".js", ".json"] },
  },
};
