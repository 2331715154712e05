/**
 * Three projects, so that `npm test` can run all and a contributor can run one:
 *   core     src, functions, taskpane without a browser, the xlsx patcher
 *   workbook the headless engine and the commands
 *   page     the pages in a real Chromium
 */
const swc = {
  '^.+\\.[tj]sx?$': [
    '@swc/jest',
    {
      jsc: { parser: { syntax: 'typescript' }, target: 'es2022' },
      module: { type: 'commonjs' },
    },
  ],
};

const base = {
  testEnvironment: 'node',
  rootDir: __dirname,
  transform: swc,
  // ml-regression is CommonJS over packages that are ES modules only; strip-bom and node-fetch likewise
  transformIgnorePatterns: [
    '/node_modules/(?!(is-any-array|ml-[a-z0-9-]+|strip-bom|node-fetch|data-uri-to-buffer|fetch-blob|formdata-polyfill|uuid|lodash-es|nanoid|numfmt|ot-json1|unicount|ot-text-unicode|kdbush|rbush|quickselect|cjk-regex)/)',
  ],
};

module.exports = {
  projects: [
    {
      ...base,
      displayName: 'core',
      testMatch: [
        '<rootDir>/tests/src/**/*.test.ts',
        '<rootDir>/tests/functions/**/*.test.ts',
        '<rootDir>/tests/taskpane/**/*.test.ts',
        '<rootDir>/tests/project/**/*.test.ts',
      ],
    },
    { ...base, displayName: 'workbook', testMatch: ['<rootDir>/tests/workbook/**/*.test.ts'] },
    { ...base, displayName: 'page', testMatch: ['<rootDir>/tests/page/**/*.test.ts'] },
  ],
};
