import js from "@eslint/js";
import redos from "eslint-plugin-redos";
import regexp from "eslint-plugin-regexp";
import { defineConfig, globalIgnores } from "eslint/config";
import tseslint from "typescript-eslint";

export default defineConfig(
  globalIgnores(["dist/", "docs/api/", "coverage/", "reports/", ".stryker-tmp/", "tests/.generated/"]),
  { linterOptions: { reportUnusedDisableDirectives: "error" } },
  js.configs.recommended,
  regexp.configs["flat/recommended"],
  {
    // what reads a stranger's text; tests read the files of this project
    files: ["src/**", "examples/**"],
    plugins: { redos },
    rules: { "redos/no-vulnerable": ["error", { timeout: 20_000 }] },
  },
  {
    files: ["**/*.ts"],
    ignores: ["tests/package/consumer/**"],
    extends: [tseslint.configs.strictTypeChecked, tseslint.configs.stylisticTypeChecked],
    languageOptions: { parserOptions: { project: "./tsconfig.tools.json", tsconfigRootDir: import.meta.dirname } },
    rules: {
      "@typescript-eslint/consistent-type-imports": "error",
      "@typescript-eslint/no-confusing-void-expression": ["error", { ignoreArrowShorthand: true }],
      // asks for `!`, which the strict rules forbid
      "@typescript-eslint/non-nullable-type-assertion-style": "off",
      // a number in a text is what half of this library is about
      "@typescript-eslint/restrict-template-expressions": ["error", { allowNumber: true }],
    },
  },
  {
    files: ["src/**/*.ts"],
    languageOptions: { parserOptions: { project: "./tsconfig.json" } },
    rules: {
      // isolated declarations want some of these types written out
      "@typescript-eslint/no-inferrable-types": "off",
      "no-eval": "error",
      "no-new-func": "error",
      "@typescript-eslint/no-implied-eval": "error",
      "no-restricted-globals": ["error", "Function", "eval", "process", "console", "Date"],
      "no-restricted-syntax": [
        "error",
        { selector: "ImportExpression", message: "src loads everything when it is loaded itself." },
        { selector: "ExportDefaultDeclaration", message: "Exports have names." },
        {
          selector: "ImportDeclaration[source.value='decimal.js'] > ImportDefaultSpecifier",
          message: "Import { Decimal } by name: the default import fails for some users' compilers.",
        },
        {
          selector: "MemberExpression[property.name='random'][object.name='Math']",
          message: "Same arguments, same result.",
        },
      ],
    },
  },
  {
    // tests read our own output, not a stranger's, and hand over wrong things on purpose
    files: ["tests/**"],
    rules: {
      "no-loss-of-precision": "off",
      "redos/no-vulnerable": "off",
      "regexp/no-misleading-capturing-group": "off",
      "regexp/no-super-linear-backtracking": "off",
    },
  },
  {
    files: ["tests/**/*.ts"],
    ignores: ["tests/package/consumer/**"],
    rules: {
      "@typescript-eslint/no-misused-spread": "off",
      "@typescript-eslint/no-unsafe-class-instance-assignment": "off",
      "@typescript-eslint/only-throw-error": "off",
    },
  },
  {
    files: ["**/*.{js,mjs,cjs}"],
    languageOptions: { globals: nodeGlobals() },
  },
  {
    // compiled by tests/package/check.mjs against the packed tarball, outside the repo
    files: ["tests/package/consumer/**/*.{ts,mts,cts}"],
    extends: [tseslint.configs.strict],
    rules: {
      "@typescript-eslint/ban-ts-comment": "off",
      "@typescript-eslint/no-unused-vars": "off",
    },
  },
);

/** What the small programs outside src use of Node. */
function nodeGlobals() {
  const names = ["console", "process", "URL", "structuredClone", "performance", "globalThis", "require", "module"];
  return Object.fromEntries(names.map((name) => [name, "readonly"]));
}
