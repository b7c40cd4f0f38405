/** The state that a run begins with, where it is not cold and discharged. */
export interface StartState {
  /** K, one for each element. */
  temperatures: readonly number[];
  busVoltage: number;
  /** Whether each element's contact is still closed at switch-on, and for how long it stays so (s). */
  contactsClosedFor: readonly (number | null)[];
}

export interface RunOptions {
  /** s from switch-on. */
  duration: number;
  start?: StartState;
  /** End at the first instant that answers the question; figures beyond it are null. */
  stopAt?: 'first-pulse' | 'charged' | 'steady';
  /** Relative local error of a step; default 1e-5 or what the audit needs. */
  tolerance?: number;
  /** Traces cost time; a study that needs none leaves them out (empty series). Default true. */
  traces?: boolean;
  /** Never leave the waveform scale, however many steps it takes; for the benchmark and tests. Default false. */
  waveformOnly?: boolean;
}
