import js from "@eslint/js";
import reactHooks from "eslint-plugin-react-hooks";
import tseslint from "typescript-eslint";

export default tseslint.config(
  {
    ignores: ["**/dist/**", "**/coverage/**", ".cache/**", ".data/**", ".screens/**", "**/generated/**", "**/*.d.mts"],
  },
  js.configs.recommended,
  ...tseslint.configs.recommendedTypeChecked,
  {
    languageOptions: {
      parserOptions: {
        projectService: { allowDefaultProject: ["*.js", "*.cjs", "vitest.config.ts"] },
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      "@typescript-eslint/no-floating-promises": "error",
      "@typescript-eslint/switch-exhaustiveness-check": ["error", { considerDefaultExhaustiveForUnions: true }],
      "@typescript-eslint/consistent-type-imports": "error",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
      "@typescript-eslint/restrict-template-expressions": ["error", { allowNumber: true, allowBoolean: true }],
      eqeqeq: "error",
      "no-console": "error",
    },
  },
  {
    files: ["apps/web/**/*.{ts,tsx}"],
    extends: [reactHooks.configs.flat.recommended],
    // Says that a virtual list cannot be memoized by a compiler that we do not use.
    rules: { "react-hooks/incompatible-library": "off" },
  },
  {
    // Plain JavaScript: the start-up runs before anything is installed, so it cannot be TypeScript.
    files: ["**/*.{js,mjs,cjs}"],
    extends: [tseslint.configs.disableTypeChecked],
    languageOptions: {
      globals: {
        process: "readonly",
        console: "readonly",
        fetch: "readonly",
        URL: "readonly",
        Buffer: "readonly",
        setTimeout: "readonly",
        clearTimeout: "readonly",
        setInterval: "readonly",
        clearInterval: "readonly",
        AbortSignal: "readonly",
        AbortController: "readonly",
        document: "readonly",
        localStorage: "readonly",
        window: "readonly",
        performance: "readonly",
        module: "writable",
      },
    },
    rules: { "no-console": "off" },
  },
  {
    files: ["**/cli.ts", "tests/bench/**", "tests/screens/**", "tests/support/quiet.ts", "migrations/**"],
    rules: { "no-console": "off" },
  },
);
