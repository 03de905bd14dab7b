import { churchillChu1975Cylinder } from './churchill-chu-1975-cylinder.ts';
import { churchillChu1975Plate } from './churchill-chu-1975-plate.ts';
import { mcadams1954Cylinder } from './mcadams-1954-cylinder.ts';

export const naturalConvection = [churchillChu1975Plate, churchillChu1975Cylinder, mcadams1954Cylinder];
