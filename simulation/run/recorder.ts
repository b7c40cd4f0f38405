/** One instant of a run; SI. Elements in order. */
export interface Point {
  time: number;
  /** Signed line current. */
  current: number;
  bus: number;
  i2t: number;
  temperature: number[];
  energy: number[];
}

/** A half period (DC: a window) in one row. */
export interface Period {
  start: number;
  end: number;
  peak: number;
  rms: number;
  lowestBus: number;
  highestBus: number;
  /** Mean power from the source, W. */
  sourcePower: number;
  /** Mean power in each body, W. */
  bodyPower: number[];
  temperature: number[];
  energy: number[];
  i2t: number;
}
