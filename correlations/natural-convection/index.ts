import { catton1978Squat } from './catton-1978-squat.ts';
import { catton1978Tall } from './catton-1978-tall.ts';
import { churchill1983Sphere } from './churchill-1983-sphere.ts';
import { churchillChu1975Cylinder } from './churchill-chu-1975-cylinder.ts';
import { churchillChu1975CylinderLaminar } from './churchill-chu-1975-cylinder-laminar.ts';
import { churchillChu1975Plate } from './churchill-chu-1975-plate.ts';
import { churchillChu1975PlateLaminar } from './churchill-chu-1975-plate-laminar.ts';
import { globeDropkin1959 } from './globe-dropkin-1959.ts';
import { macgregorEmery1969Laminar } from './macgregor-emery-1969-laminar.ts';
import { macgregorEmery1969Turbulent } from './macgregor-emery-1969-turbulent.ts';
import { mcadams1954Cylinder } from './mcadams-1954-cylinder.ts';
import { mcadams1954PlateDown } from './mcadams-1954-plate-down.ts';
import { mcadams1954PlateLaminar } from './mcadams-1954-plate-laminar.ts';
import { mcadams1954PlateTurbulent } from './mcadams-1954-plate-turbulent.ts';
import { mcadams1954PlateTurbulentOriginal } from './mcadams-1954-plate-turbulent-original.ts';
import { mcadams1954PlateUpLaminar } from './mcadams-1954-plate-up-laminar.ts';
import { mcadams1954PlateUpTurbulent } from './mcadams-1954-plate-up-turbulent.ts';
import { radziemskaLewandowski2001PlateDown } from './radziemska-lewandowski-2001-plate-down.ts';

export const naturalConvection = [
  catton1978Squat,
  catton1978Tall,
  churchill1983Sphere,
  churchillChu1975Cylinder,
  churchillChu1975CylinderLaminar,
  churchillChu1975Plate,
  churchillChu1975PlateLaminar,
  globeDropkin1959,
  macgregorEmery1969Laminar,
  macgregorEmery1969Turbulent,
  mcadams1954Cylinder,
  mcadams1954PlateDown,
  mcadams1954PlateLaminar,
  mcadams1954PlateTurbulent,
  mcadams1954PlateTurbulentOriginal,
  mcadams1954PlateUpLaminar,
  mcadams1954PlateUpTurbulent,
  radziemskaLewandowski2001PlateDown,
];
