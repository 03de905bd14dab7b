import { gelperinEinstein1971Wide } from './gelperin-einstein-1971-wide.ts';
import { gunn1978Fluidised } from './gunn-1978-fluidised.ts';
import { molerus1995Fine } from './molerus-1995-fine.ts';
import { zabrodsky1976Wall } from './zabrodsky-1976-wall.ts';

export const fluidisedBed = [gelperinEinstein1971Wide, gunn1978Fluidised, molerus1995Fine, zabrodsky1976Wall];
