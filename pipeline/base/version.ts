/** The same as in package.json; test/base/version.test.ts holds them together. */
export const version = '0.1.0';
