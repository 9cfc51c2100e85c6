/** Limits are given to a thousandth, as they are shown: 24 V × 1.2 is 28.8, not 28.799999999999997. */
export const inThousandths = (value: number): number => Math.round(value * 1000) / 1000;
