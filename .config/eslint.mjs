import tseslint from 'typescript-eslint';

const clockAndChance = [
  {
    selector: "MemberExpression[object.name='Math'][property.name='random']",
    message: 'Randomness is an argument: pass a seed.',
  },
  {
    selector: "MemberExpression[object.name='Date'][property.name='now']",
    message: 'The date is an argument.',
  },
  { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: 'The date is an argument.' },
];

export default tseslint.config(
  { ignores: ['dist/**', 'node_modules/**', 'coverage/**', '**/*.mjs', '**/*.cjs'] },
  ...tseslint.configs.strictTypeChecked,
  {
    languageOptions: {
      parserOptions: {
        project: [
          './tsconfig.json',
          './lib/tsconfig.json',
          './lib/cli/tsconfig.json',
          './notebooks/tsconfig.json',
          './test/tsconfig.json',
        ],
        tsconfigRootDir: `${import.meta.dirname}/..`,
      },
    },
    rules: {
      '@typescript-eslint/restrict-template-expressions': [
        'error',
        { allowNumber: true, allowBoolean: true },
      ],
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/prefer-readonly': 'off',
      '@typescript-eslint/no-unnecessary-condition': ['error', { allowConstantLoopConditions: true }],
      '@typescript-eslint/no-confusing-void-expression': 'off',
    },
  },
  { files: ['lib/**/*.ts'], rules: { 'no-restricted-syntax': ['error', ...clockAndChance] } },
);
