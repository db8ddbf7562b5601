import js from '@eslint/js';
import globals from 'globals';
import hooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

const noBarrels = {
  selector: 'ExportAllDeclaration',
  message: 'No barrels: import from the file that has it.',
};

const leftToTheEngine = [
  ...['acos', 'acosh', 'asin', 'asinh', 'atan', 'atan2', 'atanh', 'cbrt', 'cos', 'cosh', 'exp'],
  ...['expm1', 'hypot', 'log', 'log10', 'log1p', 'log2', 'pow', 'random', 'sin', 'sinh', 'tan'],
  'tanh',
];

// Import walls live in .dependency-cruiser.cjs; here are the walls inside a file.
export default tseslint.config(
  { ignores: ['dist', 'node_modules', '.data', 'coverage'] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: false },
      ],
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/naming-convention': [
        'error',
        {
          selector: 'interface',
          format: ['PascalCase'],
          custom: { regex: '^I[A-Z]', match: false },
        },
      ],
    },
  },
  {
    rules: {
      'max-lines': ['error', { max: 400 }],
      'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx'] }],
      'no-restricted-syntax': ['error', noBarrels],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
    },
  },
  {
    files: ['shared/**/*.ts', 'server/**/*.ts', 'src/**/*.ts'],
    rules: {
      'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true }],
    },
  },
  {
    // ECMAScript leaves the last bits of these to each engine; a log must replay alike in all of them.
    files: ['shared/**/*.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        ...leftToTheEngine.map((property) => ({
          object: 'Math',
          property,
          message: 'Use shared/engine/elementary: the same bits on every machine.',
        })),
      ],
      'no-restricted-syntax': [
        'error',
        noBarrels,
        {
          selector: 'BinaryExpression[operator="**"]',
          message: 'Use square, power or powerOfTen of shared/engine/elementary.',
        },
      ],
    },
  },
  { files: ['shared/engine/index.ts'], rules: { 'no-restricted-syntax': 'off' } },
  { files: ['src/**/*.tsx'], ...hooks.configs.flat.recommended },
  {
    files: ['src/**/*.tsx'],
    rules: {
      'max-lines-per-function': ['error', { max: 120, skipBlankLines: true, skipComments: true }],
    },
  },
  { files: ['server/**', 'tests/**', '*.{js,ts}'], languageOptions: { globals: globals.node } },
  { files: ['**/*.cjs'], languageOptions: { globals: globals.commonjs, sourceType: 'commonjs' } },
);
