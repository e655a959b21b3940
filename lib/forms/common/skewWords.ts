/** A skew at the head of what is said of it, to a tenth of a degree: 'Skew 12.5 degrees'. */
export const skewWords = (skewDeg: number): string => `Skew ${Number(skewDeg.toFixed(1))} degrees`;
