import next from "eslint-config-next";
import nextTypescript from "eslint-config-next/typescript";
import prettier from "eslint-config-prettier";

const codeFiles = ["**/*.{ts,tsx,mjs}"];

// Tables of published data and generated bindings may be longer than prose code.
const dataTables = ["render/shade/cie-1931.ts"];

const noServicesInRender = {
  files: ["render/**/*.{ts,tsx}"],
  ignores: ["render/hosts/**", "render/cli.ts"],
  rules: {
    "no-restricted-imports": [
      "error",
      { patterns: ["node:*", "react", "react-dom", "next", "next/*", "drizzle-orm*", "pg"] },
    ],
    "no-restricted-globals": [
      "error",
      { name: "process", message: "render is pure: take the value as an argument." },
      { name: "fetch", message: "render is pure: take the bytes as an argument." },
      { name: "Date", message: "render knows no clock: frames carry no wall-clock dates." },
    ],
  },
};

const config = [
  { ignores: [".next/**", ".data/**", "node_modules/**", "next-env.d.ts", "drizzle/**", "public/**"] },
  ...next,
  ...nextTypescript,
  prettier,
  {
    files: codeFiles,
    rules: {
      "max-lines": ["error", { max: 300, skipBlankLines: false, skipComments: false }],
      "max-lines-per-function": ["error", { max: 40, skipBlankLines: true, skipComments: true }],
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/ban-ts-comment": ["error", { "ts-expect-error": true, "ts-ignore": true }],
      "no-console": "error",
      "no-warning-comments": ["error", { terms: ["todo", "fixme", "xxx"], location: "anywhere" }],
    },
  },
  noServicesInRender,
  // Numerical kernels are paragraphed; components are mostly markup; tests are lists of sentences.
  {
    files: ["render/**/*.ts"],
    rules: { "max-lines-per-function": ["error", { max: 90, skipBlankLines: true, skipComments: true }] },
  },
  {
    files: ["**/*.tsx"],
    rules: { "max-lines-per-function": ["error", { max: 110, skipBlankLines: true, skipComments: true }] },
  },
  { files: ["tests/**", "db/schema/**"], rules: { "max-lines-per-function": "off" } },
  { files: ["lib/local/**", "render/cli.ts", "render/hosts/speed.ts"], rules: { "no-console": "off" } },
  { files: dataTables, rules: { "max-lines": "off" } },
];

export default config;
