/** Stands in for zod's whole set of languages in the client's bundle; see metro.config.js. */
export { default as en } from 'zod/v4/locales/en.js';
