module.exports = {
  rootDir: '.',
  roots: ['<rootDir>/src'],
  testRegex: '\\.test\\.ts$',
  transform: {
    '^.+\\.ts$': [
      '@swc/jest',
      { jsc: { parser: { syntax: 'typescript' }, target: 'es2022' }, module: { type: 'commonjs' } },
    ],
  },
};
