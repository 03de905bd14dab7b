import { gnielinski1986CoilLaminar } from './gnielinski-1986-coil-laminar.ts';
import { gnielinski1986CoilTurbulent } from './gnielinski-1986-coil-turbulent.ts';

export const coil = [gnielinski1986CoilLaminar, gnielinski1986CoilTurbulent];
