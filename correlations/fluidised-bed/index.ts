import { gunn1978Fluidised } from './gunn-1978-fluidised.ts';

export const fluidisedBed = [gunn1978Fluidised];
