import { froessling1938 } from './froessling-1938.ts';
import { ranzMarshall1952 } from './ranz-marshall-1952.ts';

export const sphere = [ranzMarshall1952, froessling1938];
