import { stephan1962Both } from './stephan-1962-both.ts';
import { stephan1962Inner } from './stephan-1962-inner.ts';
import { stephan1962Outer } from './stephan-1962-outer.ts';

export const annulus = [stephan1962Both, stephan1962Inner, stephan1962Outer];
