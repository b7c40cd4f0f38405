/**
 * The physical dimensions a person can type: SI unit as shown, the same unit as typed (Ω is read as
 * `ohm`), whether it takes a prefix, and an example for messages.
 */
export const DIMENSIONS = {
  resistance: { unit: 'Ω', typed: 'ohm', prefixed: true, example: '4k7' },
  capacitance: { unit: 'F', typed: 'F', prefixed: true, example: '470u' },
  inductance: { unit: 'H', typed: 'H', prefixed: true, example: '100u' },
  voltage: { unit: 'V', typed: 'V', prefixed: true, example: '3V3' },
  current: { unit: 'A', typed: 'A', prefixed: true, example: '500m' },
  power: { unit: 'W', typed: 'W', prefixed: true, example: '100' },
  energy: { unit: 'J', typed: 'J', prefixed: true, example: '45' },
  time: { unit: 's', typed: 's', prefixed: true, example: '300m' },
  frequency: { unit: 'Hz', typed: 'Hz', prefixed: true, example: '50' },
  /** Inside: kelvin. Typed and shown in °C. */
  temperature: { unit: 'K', typed: 'K', prefixed: false, example: '85 °C' },
  /** A difference of temperatures, such as a B-value; never offset to °C. */
  temperatureInterval: { unit: 'K', typed: 'K', prefixed: false, example: '3k' },
  dissipation: { unit: 'W/K', typed: 'W/K', prefixed: true, example: '17m' },
  heatCapacity: { unit: 'J/K', typed: 'J/K', prefixed: true, example: '1.1' },
  /** Without prefixes: kA²s is read as 10³ A²s by some and as (kA)²s by others. */
  i2t: { unit: 'A²s', typed: 'A^2s', prefixed: false, example: '89' },
  /** Inside: a fraction. Typed and shown in per cent. */
  ratio: { unit: '%', typed: '%', prefixed: false, example: '20 %' },
  angle: { unit: '°', typed: 'deg', prefixed: false, example: '90' },
  count: { unit: '', typed: '', prefixed: false, example: '10000' },
} as const;

export type Dimension = keyof typeof DIMENSIONS;

/** Unit of the number inside and in JSON: a ratio is a fraction there, whatever is shown. */
export const numberUnit = (dimension: Dimension): string => (dimension === 'ratio' ? '1' : DIMENSIONS[dimension].unit);

export const ZERO_CELSIUS = 273.15;

/** How a current or voltage is meant; a qualifier that contradicts the field is refused. */
export type Qualifier = 'rms' | 'peak';
