import { achenbach1995 } from './achenbach-1995.ts';
import { gnielinski1981 } from './gnielinski-1981.ts';
import { gunn1978 } from './gunn-1978.ts';
import { guptaThodos1963 } from './gupta-thodos-1963.ts';
import { kataoka1972 } from './kataoka-1972.ts';
import { kta1983 } from './kta-1983.ts';
import { sherwoodPigfordWilke1975 } from './sherwood-pigford-wilke-1975.ts';
import { wakaoFunazkri1978 } from './wakao-funazkri-1978.ts';
import { wakaoKaguei1982 } from './wakao-kaguei-1982.ts';
import { wilsonGeankoplis1966High } from './wilson-geankoplis-1966-high.ts';
import { wilsonGeankoplis1966Low } from './wilson-geankoplis-1966-low.ts';

export const packedBed = [
  achenbach1995,
  gnielinski1981,
  gunn1978,
  guptaThodos1963,
  kataoka1972,
  kta1983,
  sherwoodPigfordWilke1975,
  wakaoFunazkri1978,
  wakaoKaguei1982,
  wilsonGeankoplis1966High,
  wilsonGeankoplis1966Low,
];
