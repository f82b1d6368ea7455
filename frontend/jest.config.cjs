const esmOnly = ['@tanstack/react-table', '@tanstack/table-core', '@tanstack/store', '@tanstack/react-store'];

module.exports = {
  rootDir: '.',
  roots: ['<rootDir>/src'],
  testRegex: '\\.test\\.tsx?$',
  testEnvironment: '<rootDir>/jest/environment.cjs',
  testEnvironmentOptions: { customExportConditions: ['resistry-source', 'browser', 'require'] },
  setupFilesAfterEnv: ['<rootDir>/jest/setup.ts'],
  moduleNameMapper: {
    '\\.css$': '<rootDir>/jest/style-sheet.cjs',
    // Their main entries are ES modules, which jest cannot require; each ships a plain script as well.
    '^(d3-[a-z-]+|internmap)$': '<rootDir>/../node_modules/$1/dist/$1.js',
  },
  transform: {
    '^.+\\.[jt]sx?$': [
      '@swc/jest',
      {
        jsc: {
          parser: { syntax: 'typescript', tsx: true },
          transform: { react: { runtime: 'automatic' } },
          target: 'es2022',
        },
        module: { type: 'commonjs' },
      },
    ],
  },
  transformIgnorePatterns: [`/node_modules/(?!(${esmOnly.join('|')})/)`],
  testTimeout: 30000,
};
