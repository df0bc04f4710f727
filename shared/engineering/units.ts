/** Exact factors to SI: NIST SP 811, appendix B; imperial gallon of 4.54609 L. */

/** kg in one pound, by definition. */
export const kgPerPound = 0.453_592_37;
/** mm in one inch, by definition. */
export const mmPerInch = 25.4;
/** km in one statute mile, by definition. */
export const kmPerMile = 1.609_344;
/** N in one pound-force: a pound under standard gravity, 9.80665 m/s². */
export const newtonsPerPoundForce = kgPerPound * 9.806_65;
/** Pa in one pound-force a square inch. */
export const paPerPsi = newtonsPerPoundForce / (mmPerInch / 1_000) ** 2;
export const paPerBar = 100_000;
/** Litres in one imperial pint. */
export const litresPerPint = 0.568_261_25;
/** J in one British thermal unit, International Table. */
export const joulesPerBtu = 1_055.055_852_62;
/** K in one degree Fahrenheit. */
export const kelvinPerFahrenheit = 5 / 9;
/** K at 0 °C. */
export const celsiusZeroK = 273.15;
/** K at 0 °F. */
export const fahrenheitZeroK = 459.67 * kelvinPerFahrenheit;
