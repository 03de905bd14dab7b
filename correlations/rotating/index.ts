import { eisenbergTobiasWilke1954 } from './eisenberg-tobias-wilke-1954.ts';
import { jang2022 } from './jang-2022.ts';
import { levich1942Disk } from './levich-1942-disk.ts';

export const rotating = [eisenbergTobiasWilke1954, jang2022, levich1942Disk];
