import { graetz1885Fibre } from './graetz-1885-fibre.ts';
import { leveque1928ChannelLocal } from './leveque-1928-channel-local.ts';
import { leveque1928ChannelMean } from './leveque-1928-channel-mean.ts';
import { leveque1928Fibre } from './leveque-1928-fibre.ts';
import { shahLondon1978ChannelBothWalls } from './shah-london-1978-channel-both-walls.ts';
import { shahLondon1978ChannelBothWallsFlux } from './shah-london-1978-channel-both-walls-flux.ts';
import { shahLondon1978ChannelOneWall } from './shah-london-1978-channel-one-wall.ts';
import { shahLondon1978ChannelOneWallFlux } from './shah-london-1978-channel-one-wall-flux.ts';

export const membrane = [
  graetz1885Fibre,
  leveque1928ChannelLocal,
  leveque1928ChannelMean,
  leveque1928Fibre,
  shahLondon1978ChannelBothWalls,
  shahLondon1978ChannelBothWallsFlux,
  shahLondon1978ChannelOneWall,
  shahLondon1978ChannelOneWallFlux,
];
