import js from '@eslint/js';
import hooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** Math functions whose bits differ between JavaScript engines; the page and the server must agree to the last bit. */
const inexact = [
  'pow',
  'sin',
  'cos',
  'tan',
  'asin',
  'acos',
  'atan',
  'atan2',
  'exp',
  'expm1',
  'log',
  'log10',
  'log2',
  'log1p',
  'cbrt',
  'hypot',
  'sinh',
  'cosh',
  'tanh',
  'random',
];

export default tseslint.config(
  { ignores: ['dist/**', 'data/**', 'node_modules/**', 'test-results/**', 'playwright-report/**', 'scripts/**/*.cjs'] },
  js.configs.recommended,
  ...tseslint.configs.strict,
  {
    languageOptions: {
      globals: {
        process: 'readonly',
        console: 'readonly',
        setTimeout: 'readonly',
        clearTimeout: 'readonly',
        setInterval: 'readonly',
        clearInterval: 'readonly',
        URL: 'readonly',
        Buffer: 'readonly',
        fetch: 'readonly',
        performance: 'readonly',
      },
    },
    rules: {
      'max-lines': ['error', { max: 400 }],
      eqeqeq: 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
    },
  },
  { files: ['**/*.ts', '**/*.tsx'], rules: { 'no-undef': 'off' } },
  { files: ['client/**/*.{ts,tsx}'], ...hooks.configs.flat['recommended-latest'] },
  {
    files: ['shared/engineering/**/*.ts'],
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        ...inexact.map((property) => ({
          object: 'Math',
          property,
          message: 'Inexact across JavaScript engines: use + - * / and Math.sqrt.',
        })),
      ],
      'no-restricted-syntax': [
        'error',
        {
          selector: "BinaryExpression[operator='**']",
          message: 'Write the product: ** differs between engines in its last bits.',
        },
        { selector: "NewExpression[callee.name='Date']", message: 'The engine has no clock.' },
        { selector: "MemberExpression[object.name='Date']", message: 'The engine has no clock.' },
      ],
    },
  },
  {
    files: ['shared/**/*.ts'],
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-globals': [
        'error',
        'process',
        'Buffer',
        'window',
        'document',
        'fetch',
        'setTimeout',
        'performance',
      ],
    },
  },
);
