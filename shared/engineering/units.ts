/** Exact factors to SI: NIST SP 811, appendix B; imperial gallon of 4.54609 L. */

/** Pa in one pound-force a square inch. */
export const paPerPsi = 6_894.757_293_168;
export const paPerBar = 100_000;
/** mm in one inch, by definition. */
export const mmPerInch = 25.4;
/** Litres in one imperial pint. */
export const litresPerPint = 0.568_261_25;
/** kg in one pound, by definition. */
export const kgPerPound = 0.453_592_37;
/** km in one statute mile, by definition. */
export const kmPerMile = 1.609_344;
