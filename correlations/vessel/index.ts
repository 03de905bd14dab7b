import { chilton1944JacketTurbine } from './chilton-1944-jacket-turbine.ts';

export const vessel = [chilton1944JacketTurbine];
