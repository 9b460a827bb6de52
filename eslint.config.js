import eslint from "@eslint/js";
import globals from "globals";
import tseslint from "typescript-eslint";

export default tseslint.config(
  { ignores: ["dist/", "coverage/", "reports/", ".stryker-tmp/"] },
  eslint.configs.recommended,
  tseslint.configs.recommended,
  {
    rules: {
      // Cells may hold anything, and the front doors must say any[][] for the metadata generator.
      "@typescript-eslint/no-explicit-any": "off",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_" }],
      eqeqeq: "error",
    },
  },
  { files: ["**/*.js"], languageOptions: { globals: globals.node } },
);
