export const STANDARD_GRAVITY = 9.80665; // m/s2, exact, 3rd CGPM 1901
export const GAS_CONSTANT = 8.314462618; // J/(mol K), CODATA 2018
export const FARADAY = 96_485.33212; // C/mol, CODATA 2018
