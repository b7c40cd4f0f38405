/**
 * The one door to what is drawn by victory-native. It is imported on demand only, and from one file, so that the
 * library lies in a chunk of its own and not among what every page loads.
 */
export { CurveLayer } from './CurveLayer';
export { TraceLanes } from './TraceLanes';
