import { defineConfig, globalIgnores } from "eslint/config";
import nextVitals from "eslint-config-next/core-web-vitals";
import nextTypescript from "eslint-config-next/typescript";

const noStyle = "The content policy blocks inline styles: use a class, an SVG attribute or element.animate().";

/** Files whose default export the framework or a tool asks for. */
const defaultExported = [
  "app/**/{page,layout,error,global-error,not-found,loading,template,default,icon,manifest}.tsx",
  "*.config.{ts,mjs}",
  "tests/closing-line.ts",
  "tests/{cluster,served}.ts",
];

export default defineConfig([
  globalIgnores([".next*/**", ".stillyard/**", "node_modules/**", "next-env.d.ts", "coverage/**"]),
  ...nextVitals,
  ...nextTypescript,
  {
    rules: {
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
      "import/no-default-export": "error",
      "react/forbid-component-props": ["error", { forbid: [{ propName: "style", message: noStyle }] }],
      "react/forbid-dom-props": ["error", { forbid: [{ propName: "style", message: noStyle }] }],
      "no-console": ["error", { allow: ["warn", "error"] }],
    },
  },
  { files: defaultExported, rules: { "import/no-default-export": "off" } },
  { files: ["scripts/**", "tests/**"], rules: { "no-console": "off" } },
]);
