import { sherwoodPigfordWilke1975 } from './sherwood-pigford-wilke-1975.ts';

export const packedBed = [sherwoodPigfordWilke1975];
