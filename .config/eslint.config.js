import globals from 'globals'
import hooks from 'eslint-plugin-react-hooks'
import tseslint from 'typescript-eslint'

/** Imports go one way: calc ← content ← api, site. Each entry forbids what its folder must not reach. */
const boundary = (files, patterns, ignores = []) => ({
  files,
  ignores,
  rules: { '@typescript-eslint/no-restricted-imports': ['error', { patterns }] },
})
const never = (regex, message) => ({ regex, message })

const wholeLibrary = {
  ...never(
    '^#calc/(index|solve|calculators)\\.ts$',
    'The registry brings every calculator: a browser loads each by itself (lib/load-calculator.ts).',
  ),
  allowTypeImports: true,
}

const crossesFolders = never(
  '^(\\.\\./)+(calc|content|api|site)/',
  'Cross a top-level folder by #calc, #content, #api or #site, so that the direction can be checked.',
)

export default tseslint.config(
  {
    ignores: [
      'dist/**',
      'node_modules/**',
      'drizzle/**',
      '.data/**',
      '.cache/**',
      'test-results/**',
      'playwright-report/**',
    ],
  },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      globals: { ...globals.node, ...globals.browser },
      parserOptions: { project: './tsconfig.json', tsconfigRootDir: new URL('..', import.meta.url).pathname },
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-definitions': 'off',
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/only-throw-error': ['error', { allow: [{ from: 'lib', name: 'Response' }] }],
      eqeqeq: 'error',
      'no-console': 'off',
    },
  },
  // What supertest hands back is any; each test says what it expects of it.
  { files: ['api/**/*.spec.ts', 'api/**/*.e2e-spec.ts'], rules: { '@typescript-eslint/no-unsafe-assignment': 'off' } },
  { files: ['site/**/*.{ts,tsx}'], ...hooks.configs.flat['recommended-latest'] },
  boundary(
    ['calc/**/*.ts'],
    [
      crossesFolders,
      never('^#(content|api|site)/', 'calc stands alone.'),
      never('^(?!\\.|#calc/|mathjs$)', 'calc imports nothing outside itself but mathjs.'),
    ],
    ['calc/**/*.test.ts', 'calc/testing/**', 'calc/bench/**'],
  ),
  boundary(['content/**/*.ts'], [crossesFolders, never('^#(api|site)/', 'content knows only calc.')]),
  boundary(['api/**/*.ts'], [crossesFolders, never('^#site/', 'the server does not know the site.')]),
  boundary(
    ['site/src/**/*.{ts,tsx}'],
    [
      crossesFolders,
      never('^#api/(?!.*dto/.*\\.schema\\.ts$)', 'site shares only the request and response schemas of the server.'),
      wholeLibrary,
      never('^#calc/marking', 'answers and mistakes never reach the browser.'),
      never('question-bank|\\.questions\\.yaml', 'banks never reach the browser.'),
    ],
    ['**/*.test.{ts,tsx}'],
  ),
  boundary(
    ['site/src/features/**/*.{ts,tsx}'],
    [
      crossesFolders,
      never('^#api/(?!.*dto/.*\\.schema\\.ts$)', 'site shares only the request and response schemas of the server.'),
      wholeLibrary,
      never('^#calc/marking', 'answers and mistakes never reach the browser.'),
      never('question-bank|\\.questions\\.yaml', 'banks never reach the browser.'),
      never(
        '(^#site/features/|^\\.\\./[a-z-]+/|^\\.\\./\\.\\./features/)',
        'features do not import each other: move what two need to components or lib.',
      ),
    ],
    ['**/*.test.{ts,tsx}'],
  ),
)
