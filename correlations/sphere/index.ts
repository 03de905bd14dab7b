import { froessling1938 } from './froessling-1938.ts';
import { levich1962Creeping } from './levich-1962-creeping.ts';
import { ranzMarshall1952 } from './ranz-marshall-1952.ts';
import { whitaker1972 } from './whitaker-1972.ts';

export const sphere = [froessling1938, levich1962Creeping, ranzMarshall1952, whitaker1972];
