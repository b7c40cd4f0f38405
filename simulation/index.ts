export { ENGINE_VERSION } from './engine-version';
export { resistanceCurve } from './study/resistance-curve';
export { assess, simulate, type AssessOptions } from './study/assess';
