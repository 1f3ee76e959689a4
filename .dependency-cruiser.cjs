/** Allowed imports between our own folders (architecture: nothing imports upward). */
const own = "^(app|components|lib|db|seeds|tests)/";
const allowed = {
  "lib/physiology": [],
  "lib/protocol": ["lib/physiology"],
  "lib/contracts": ["lib/physiology"],
  "lib/format": [],
  "lib/env.ts": [],
  "lib/launch": [],
  db: ["lib/env.ts"],
  "lib/access": ["db", "lib/contracts", "lib/env.ts"],
  "lib/http": ["lib/access", "lib/contracts", "db", "lib/env.ts"],
  "lib/chart": ["db", "lib/protocol", "lib/physiology", "lib/contracts", "lib/access", "lib/format"],
  "lib/client": ["lib/contracts", "lib/format"],
  components: ["lib/client", "lib/contracts", "lib/physiology", "lib/protocol", "lib/format"],
  app: ["lib/http", "lib/chart", "lib/contracts", "lib/access", "components", "lib/client", "lib/format", "lib/env.ts"],
};
const prefix = (folder) => (folder.endsWith(".ts") ? `^${folder.replace(".", "\\.")}$` : `^${folder}/`);

module.exports = {
  forbidden: [
    ...Object.entries(allowed).map(([from, to]) => ({
      name: `${from} imports only what is downstream`,
      severity: "error",
      from: { path: prefix(from) },
      to: { path: own, pathNot: [prefix(from), ...to.map(prefix)] },
    })),
    {
      name: "the core takes no packages",
      severity: "error",
      from: { path: "^lib/(physiology|protocol|launch)/" },
      to: { dependencyTypes: ["npm", "npm-dev", "npm-optional", "npm-peer"] },
    },
    {
      name: "no cycles",
      severity: "error",
      from: { path: own },
      to: { circular: true },
    },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    exclude: { path: "^\\.next/" },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.json" },
    enhancedResolveOptions: {
      exportsFields: ["exports"],
      conditionNames: ["import", "require", "node", "default", "types"],
    },
  },
};
