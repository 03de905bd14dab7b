import { gunn1978Fluidised } from './gunn-1978-fluidised.ts';
import { zabrodsky1976Wall } from './zabrodsky-1976-wall.ts';

export const fluidisedBed = [gunn1978Fluidised, zabrodsky1976Wall];
