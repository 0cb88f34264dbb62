// Suites that judge the code alone; `npm run mutate` runs them once for each change that Stryker makes.
import { defineConfig } from "vitest/config";
import base from "./vitest.config.js";

export default defineConfig({
  ...base,
  test: {
    // the quick suites of the rooms that are changed: with the exhaustive ones a run would take days
    include: [
      "tests/unit/{units,limits,iso286,convertLimits,judgeMeasurement}*.test.ts",
      "tests/published/{iso286,conversion}.test.ts",
    ],
    // it reads the sources themselves, and what it looks for is changed text there
    testNamePattern: /^(?!.*every code that units, limits and iso286 can throw)/,
  },
});
