import { fourier1822Layer } from './fourier-1822-layer.ts';
import { fourier1822TubeLayer } from './fourier-1822-tube-layer.ts';
import { langmuir1918Sphere } from './langmuir-1918-sphere.ts';

export const layer = [fourier1822Layer, fourier1822TubeLayer, langmuir1918Sphere];
