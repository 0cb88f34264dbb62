import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const src = fileURLToPath(new URL("src", import.meta.url));

export default defineConfig({
  resolve: {
    // tests use the package by its own names, as a caller does
    alias: [
      { find: /^limitsmith$/, replacement: `${src}/index.ts` },
      { find: /^limitsmith\/errors$/, replacement: `${src}/errors.ts` },
      { find: /^limitsmith\/([A-Za-z0-9]+)$/, replacement: `${src}/$1/index.ts` },
    ],
  },
  test: {
    include: ["tests/{unit,property,published,exhaustive,attack,docs}/**/*.test.ts"],
    // a skipped or focused test is a mistake here
    allowOnly: false,
  },
});
