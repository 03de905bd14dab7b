import { martin1977Round } from './martin-1977-round.ts';
import { martin1977RoundMass } from './martin-1977-round-mass.ts';

export const impingingJet = [martin1977Round, martin1977RoundMass];
