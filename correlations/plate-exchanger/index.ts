import { shahLondon1978Gap } from './shah-london-1978-gap.ts';

export const plateExchanger = [shahLondon1978Gap];
