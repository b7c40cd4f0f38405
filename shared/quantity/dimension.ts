/** The physical dimensions a person can type, each with its SI unit and how it is shown. */
export const DIMENSIONS = {
  resistance: { unit: 'Ω', example: '4k7' },
  capacitance: { unit: 'F', example: '470u' },
  inductance: { unit: 'H', example: '100u' },
  voltage: { unit: 'V', example: '3V3' },
  current: { unit: 'A', example: '500m' },
  power: { unit: 'W', example: '100' },
  energy: { unit: 'J', example: '45' },
  time: { unit: 's', example: '300m' },
  frequency: { unit: 'Hz', example: '50' },
  /** Inside: kelvin. Typed and shown in °C. */
  temperature: { unit: 'K', example: '85 °C' },
  /** A difference of temperatures, such as a B-value; never offset to °C. */
  temperatureInterval: { unit: 'K', example: '3k' },
  dissipation: { unit: 'W/K', example: '17m' },
  heatCapacity: { unit: 'J/K', example: '1.1' },
  i2t: { unit: 'A²s', example: '89' },
  /** Inside: a fraction. Typed and shown in per cent. */
  ratio: { unit: '%', example: '20 %' },
  angle: { unit: '°', example: '90' },
  count: { unit: '', example: '10000' },
} as const;

export type Dimension = keyof typeof DIMENSIONS;

/** How a current or voltage is meant; a qualifier that contradicts the field is refused. */
export type Qualifier = 'rms' | 'peak';
