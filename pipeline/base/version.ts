/** Version of this package; the test beside it holds it to package.json. */
export const version = '0.1.0';
