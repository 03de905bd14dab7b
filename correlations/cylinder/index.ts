import { bedingfieldDrew1950 } from './bedingfield-drew-1950.ts';
import { churchillBernstein1977 } from './churchill-bernstein-1977.ts';
import { hilpert1933High } from './hilpert-1933-high.ts';

export const cylinder = [churchillBernstein1977, hilpert1933High, bedingfieldDrew1950];
