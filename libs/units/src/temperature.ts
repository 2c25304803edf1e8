/** Absolute zero, degrees Fahrenheit. */
export const absoluteZeroF = -459.67;

/** Kelvin from degrees Fahrenheit. */
export const kelvinFromF = (temperatureF: number): number => ((temperatureF - absoluteZeroF) * 5) / 9;

/** Degrees Fahrenheit from kelvin. */
export const fFromKelvin = (temperatureK: number): number => (temperatureK * 9) / 5 + absoluteZeroF;

/** Degrees Rankine from degrees Fahrenheit. */
export const rankineFromF = (temperatureF: number): number => temperatureF - absoluteZeroF;
