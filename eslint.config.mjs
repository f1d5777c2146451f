import tseslint from "typescript-eslint";

const noSkippedTest = [
  {
    selector:
      "MemberExpression[object.name=/^(test|it|describe)$/][property.name=/^(only|skip|todo|fails)$/]",
    message: "a test runs and can fail",
  },
];

export default tseslint.config(
  { ignores: ["test/project/consumer/", "dist/", "out/", "coverage/", ".venv/"] },
  { linterOptions: { reportUnusedDisableDirectives: "error" } },
  ...tseslint.configs.recommendedTypeChecked,
  {
    languageOptions: { parserOptions: { project: "test/tsconfig.json" } },
    rules: {
      eqeqeq: "error",
      "array-callback-return": "error",
      "no-constructor-return": "error",
      "no-self-compare": "error",
      "no-template-curly-in-string": "error",
      "no-unreachable-loop": "error",
      "no-constant-binary-expression": "error",
      "default-case-last": "error",
      "no-eval": "error",
      "no-new-wrappers": "error",
      "@typescript-eslint/consistent-type-imports": [
        "error",
        { fixStyle: "inline-type-imports", disallowTypeAnnotations: false },
      ],
      "@typescript-eslint/switch-exhaustiveness-check": [
        "error",
        { considerDefaultExhaustiveForUnions: true },
      ],
      "@typescript-eslint/prefer-readonly": "error",
      "@typescript-eslint/return-await": "error",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
      // nothing here uses `this` but the two error types
      "@typescript-eslint/unbound-method": "off",
      // noUncheckedIndexedAccess makes `x[i]!` the way to read a typed array in a bounded loop
      "@typescript-eslint/no-non-null-assertion": "off",
      "@typescript-eslint/restrict-template-expressions": [
        "error",
        { allowNumber: true, allowBoolean: true },
      ],
    },
  },
  {
    files: ["src/**/*.ts", "kernel/**/*.ts"],
    rules: {
      "max-lines": ["error", 300],
      "max-lines-per-function": ["error", 100],
      "no-console": "error",
    },
  },
  // the command line and the runner talk to a terminal
  { files: ["kernel/**/*.ts"], rules: { "no-console": "off" } },
  { files: ["test/**/*.ts"], rules: { "no-restricted-syntax": ["error", ...noSkippedTest] } },
  { files: ["**/*.mjs"], ...tseslint.configs.disableTypeChecked },
);
