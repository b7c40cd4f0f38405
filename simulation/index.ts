export { ENGINE_VERSION } from './engine-version';
export { resistanceAt25, resistanceCurve } from './study/resistance-curve';
export { assess, simulate, type AssessOptions } from './study/assess';
