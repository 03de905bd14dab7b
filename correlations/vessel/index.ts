import { brooksSu1959RetreatBlade } from './brooks-su-1959-retreat-blade.ts';
import { chilton1944JacketPaddle } from './chilton-1944-jacket-paddle.ts';
import { chilton1944JacketTurbine } from './chilton-1944-jacket-turbine.ts';
import { penney2004AnchorTransition } from './penney-2004-anchor-transition.ts';
import { penney2004AnchorTurbulent } from './penney-2004-anchor-turbulent.ts';
import { penney2004BottomDiskTurbine } from './penney-2004-bottom-disk-turbine.ts';
import { penney2004BottomFourFlatBlades } from './penney-2004-bottom-four-flat-blades.ts';
import { penney2004BottomFourPitchedBlades } from './penney-2004-bottom-four-pitched-blades.ts';
import { penney2004BottomHydrofoil } from './penney-2004-bottom-hydrofoil.ts';
import { penney2004CoilDiskTurbine } from './penney-2004-coil-disk-turbine.ts';
import { penney2004CoilPropeller } from './penney-2004-coil-propeller.ts';
import { penney2004RibbonLaminar } from './penney-2004-ribbon-laminar.ts';
import { penney2004RibbonTransition } from './penney-2004-ribbon-transition.ts';
import { penney2004RibbonTurbulent } from './penney-2004-ribbon-turbulent.ts';
import { penney2004WallFourFlatBlades } from './penney-2004-wall-four-flat-blades.ts';
import { penney2004WallFourPitchedBlades } from './penney-2004-wall-four-pitched-blades.ts';
import { penney2004WallHydrofoil } from './penney-2004-wall-hydrofoil.ts';
import { penney2004WallPropeller } from './penney-2004-wall-propeller.ts';

export const vessel = [
  brooksSu1959RetreatBlade,
  chilton1944JacketPaddle,
  chilton1944JacketTurbine,
  penney2004AnchorTransition,
  penney2004AnchorTurbulent,
  penney2004BottomDiskTurbine,
  penney2004BottomFourFlatBlades,
  penney2004BottomFourPitchedBlades,
  penney2004BottomHydrofoil,
  penney2004CoilDiskTurbine,
  penney2004CoilPropeller,
  penney2004RibbonLaminar,
  penney2004RibbonTransition,
  penney2004RibbonTurbulent,
  penney2004WallFourFlatBlades,
  penney2004WallFourPitchedBlades,
  penney2004WallHydrofoil,
  penney2004WallPropeller,
];
