/** The time comes from outside, so that a test can let hours pass. */
export type Clock = () => Date;
