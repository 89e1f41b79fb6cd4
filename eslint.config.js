import reactHooks from "eslint-plugin-react-hooks";
import tseslint from "typescript-eslint";

export default tseslint.config(
  { ignores: ["node_modules", "build", "data", ".react-router", "tests/output"] },
  tseslint.configs.recommended,
  {
    files: ["**/*.ts", "**/*.tsx"],
    plugins: { "react-hooks": reactHooks },
    rules: {
      ...reactHooks.configs.recommended.rules,
      "@typescript-eslint/consistent-type-imports": "error",
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_" }],
      "no-console": ["error", { allow: ["error", "warn"] }],
    },
  },
  {
    // Their last bits differ between JavaScript engines; see "Same numbers everywhere" in DEVELOPERS.md.
    files: ["app/ocean/**"],
    ignores: ["**/*.test.ts"],
    rules: {
      "no-restricted-syntax": [
        "error",
        { selector: "BinaryExpression[operator='**']:not([right.value=2])", message: "Use power() of ocean/power." },
      ],
      "no-restricted-properties": [
        "error",
        ...["pow", "tanh"].map((property) => ({ object: "Math", property, message: "Write it by exp and log." })),
      ],
    },
  },
  { files: ["app/cli/**", "docker/**", "tests/bench/**", "tests/setup/**"], rules: { "no-console": "off" } },
);
