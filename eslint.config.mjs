import jsxA11y from 'eslint-plugin-jsx-a11y';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

const bannedSyntax = [
  {
    selector: 'MemberExpression[property.name="only"][object.name=/^(it|describe|test)$/]',
    message: 'Remove .only: it hides every other test.',
  },
  {
    selector: 'CallExpression[callee.property.name="sync"][callee.object.name=/[sS]equelize/]',
    message: 'Schema changes go through migrations.',
  },
];

/** Named constants may stand in a statement; values are bound. */
const builtSql = {
  selector:
    'CallExpression[callee.property.name="query"] > TemplateLiteral.arguments > :not(Identifier[name=/^[A-Z][A-Z_]+$/]).expressions',
  message: 'Bind values; never build SQL from strings.',
};

export default tseslint.config(
  {
    ignores: ['**/dist/**', '**/dist-types/**', '**/node_modules/**', '.data/**', '**/*.gen.ts'],
  },
  { files: ['**/*.mjs'], extends: [tseslint.configs.base] },
  {
    files: ['**/*.ts', '**/*.tsx'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: {
        project: [
          './assessments/tsconfig.lint.json',
          './certificates/tsconfig.lint.json',
          './server/tsconfig.lint.json',
          './site/tsconfig.lint.json',
        ],
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/require-await': 'off',
      'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }],
      'max-lines-per-function': ['error', { max: 50, skipBlankLines: true, skipComments: true }],
      'max-params': ['error', 3],
      complexity: ['error', 10],
      'no-eval': 'error',
      'no-new-func': 'error',
      '@typescript-eslint/no-implied-eval': 'error',
      'no-restricted-syntax': ['error', ...bannedSyntax, builtSql],
    },
  },
  {
    files: ['server/src/**/*.ts'],
    rules: {
      // Nest reads constructor types at run time: an inline type import would erase them.
      '@typescript-eslint/consistent-type-imports': 'off',
      // Constructors list what Nest injects.
      'max-params': ['error', 6],
    },
  },
  {
    files: ['site/**/*.tsx'],
    extends: [jsxA11y.flatConfigs.recommended],
    plugins: { 'react-hooks': reactHooks },
    rules: {
      ...reactHooks.configs.recommended.rules,
      'max-lines-per-function': ['error', { max: 120, skipBlankLines: true, skipComments: true }],
    },
  },
  {
    files: [
      '**/*.spec.ts',
      '**/*.spec.tsx',
      'server/test/**',
      'site/e2e/**',
      'site/src/testing/**',
    ],
    rules: {
      'max-lines': ['error', { max: 400, skipBlankLines: true, skipComments: true }],
      'max-lines-per-function': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      'no-restricted-syntax': ['error', ...bannedSyntax],
    },
  },
);
