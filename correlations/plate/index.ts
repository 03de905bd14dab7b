import { pohlhausen1921Mean } from './pohlhausen-1921-mean.ts';
import { turbulentPlate1934Mixed } from './turbulent-plate-1934-mixed.ts';
import { turbulentPlate1934Tripped } from './turbulent-plate-1934-tripped.ts';

export const plate = [pohlhausen1921Mean, turbulentPlate1934Mixed, turbulentPlate1934Tripped];
