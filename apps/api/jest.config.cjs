const { readFileSync } = require('node:fs');

const swc = JSON.parse(readFileSync(`${__dirname}/.swcrc`, 'utf8'));
// The aliases are jest's business here, by moduleNameMapper.
delete swc.jsc.baseUrl;
delete swc.jsc.paths;

/** @type {import('jest').Config} */
module.exports = {
  rootDir: '../..',
  roots: ['<rootDir>/apps/api'],
  testEnvironment: 'node',
  testMatch: ['**/*.spec.ts'],
  transform: { '^.+\\.ts$': ['@swc/jest', { ...swc, swcrc: false }] },
  moduleNameMapper: {
    '^@lampwright/([a-z]+)$': '<rootDir>/libs/$1/src/index.ts',
    '^@lampwright/([a-z]+)/testing$': '<rootDir>/libs/$1/src/testing/index.ts',
  },
  testTimeout: 60_000,
};
