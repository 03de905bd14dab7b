import { gillilandSherwood1934 } from './gilliland-sherwood-1934.ts';

export const wettedWall = [gillilandSherwood1934];
