/** Which watts a resistor should be bought for. */

/** Ratings on the shelf (common practice, no source). */
const ratings = [0.25, 0.5, 1, 2, 3, 5, 10] as const;

/** A resistor carries at most half its rating (common practice: 50 % derating). */
export const derating = 0.5;

/** The least rating that is at least twice the watts; undefined above the greatest. */
export const ratingFor = (W: number): number | undefined => ratings.find((rating) => rating * derating >= W);
