export const lead = (trial: string): string => `From readings to result, step by step: trial ${trial}`;
export const caption = (trial: string): string => `Steps of trial ${trial}`;
export const readIn = (): string => 'Read, in SI units';
export const fine = (): string => 'Numbers to six digits, so that each step can be repeated by hand.';
