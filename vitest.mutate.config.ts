// Suites that judge the code alone; `npm run mutate` runs them once for each change that Stryker makes.
import { defineConfig } from "vitest/config";
import base from "./vitest.config.js";

export default defineConfig({
  ...base,
  test: {
    include: ["tests/{unit,property,published,exhaustive}/**/*.test.ts"],
    // these two start other programs or read the sources themselves
    exclude: ["tests/unit/example.test.ts", "tests/unit/floors.test.ts"],
    // and this one reads them too: what it looks for is changed text there
    testNamePattern: /^(?!.*every code that units, limits and iso286 can throw)/,
  },
});
