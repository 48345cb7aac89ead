import { EXACT_BANDS } from "../bands";

/** Reference conditions of ISO 9613-1: K, K and the ambient pressure taken as the reference pressure. */
const ROOM_TEMPERATURE = 293.15;
const TRIPLE_POINT = 273.16;

/**
 * Attenuation by the air, dB/m, ISO 9613-1 equations (3) to (5) at sea-level pressure. Temperature -30 to 50 degC,
 * relative humidity 1 to 100 %, frequency in Hz (the exact midband). Within 10 % by the standard's own word.
 */
export function airAttenuation(frequency: number, temperature: number, humidity: number): number {
  const kelvin = temperature + 273.15;
  const relative = kelvin / ROOM_TEMPERATURE;
  const water = humidity * 10 ** (-6.8346 * (TRIPLE_POINT / kelvin) ** 1.261 + 4.6151);
  const oxygen = 24 + (4.04e4 * water * (0.02 + water)) / (0.391 + water);
  const nitrogen = relative ** -0.5 * (9 + 280 * water * Math.exp(-4.17 * (relative ** (-1 / 3) - 1)));
  const square = frequency * frequency;
  const relaxation =
    (0.01275 * Math.exp(-2239.1 / kelvin)) / (oxygen + square / oxygen) +
    (0.1068 * Math.exp(-3352 / kelvin)) / (nitrogen + square / nitrogen);
  return 8.686 * square * (1.84e-11 * relative ** 0.5 + relative ** -2.5 * relaxation);
}

/** The same over the nine octave bands, dB/m. */
export function airAttenuations(temperature: number, humidity: number): Float64Array {
  return Float64Array.from(EXACT_BANDS, (frequency) => airAttenuation(frequency, temperature, humidity));
}
