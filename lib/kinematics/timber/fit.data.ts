/**
 * ISO 286-1 and -2:2010: ranges of nominal size in millimetres, "over" the one before and "up to and
 * including", and in the same order the standard tolerances and fundamental deviations in
 * micrometres.
 *
 * Figures from memory, each checked against the standard's own formula within its rounding, over the
 * geometric mean D of a range. Tolerances: i = 0.45·∛D + D/1000, IT5 = 7i, IT6 = 10i, IT7 = 16i …
 * Below: a 265 + 1.3·D or 3.5·D; b 140 + 0.85·D or 1.8·D; c 52·D^0.2 to 10 mm and 95 + 0.8·D over 18
 * (95 between them is from memory alone); d 16·D^0.44; e 11·D^0.41; f 5.5·D^0.41; g 2.5·D^0.34.
 * Above: k 0.6·∛D; m IT7 − IT6; n 5·D^0.34; p IT7 and up to 5 more; s IT8 and a little, or
 * IT7 + 0.4·D; r the geometric mean of p and s. What stands here is the standard's rounded value: the
 * formulae do not give it to the last micrometre.
 */

/** The main ranges: tolerances and most letters go by these. */
export const mainRanges: readonly number[] = [
  3, 6, 10, 18, 30, 50, 80, 120, 180, 250, 315, 400, 500,
];

/** The finer ranges of the letters whose deviation grows quickly. */
export const fineRanges: readonly number[] = [
  3, 6, 10, 14, 18, 24, 30, 40, 50, 65, 80, 100, 120, 140, 160, 180, 200, 225, 250, 280, 315, 355,
  400, 450, 500,
];

/** Standard tolerances by grade, over the main ranges. */
export const tolerances: Readonly<Record<number, readonly number[]>> = {
  4: [3, 4, 4, 5, 6, 7, 8, 10, 12, 14, 16, 18, 20],
  5: [4, 5, 6, 8, 9, 11, 13, 15, 18, 20, 23, 25, 27],
  6: [6, 8, 9, 11, 13, 16, 19, 22, 25, 29, 32, 36, 40],
  7: [10, 12, 15, 18, 21, 25, 30, 35, 40, 46, 52, 57, 63],
  8: [14, 18, 22, 27, 33, 39, 46, 54, 63, 72, 81, 89, 97],
  9: [25, 30, 36, 43, 52, 62, 74, 87, 100, 115, 130, 140, 155],
  10: [40, 48, 58, 70, 84, 100, 120, 140, 160, 185, 210, 230, 250],
  11: [60, 75, 90, 110, 130, 160, 190, 220, 250, 290, 320, 360, 400],
  12: [100, 120, 150, 180, 210, 250, 300, 350, 400, 460, 520, 570, 630],
  13: [140, 180, 220, 270, 330, 390, 460, 540, 630, 720, 810, 890, 970],
};

/** Letters whose shaft lies under the nominal size: how far its upper limit lies under it. */
export const below: Readonly<Record<string, readonly number[]>> = {
  d: [20, 30, 40, 50, 65, 80, 100, 120, 145, 170, 190, 210, 230],
  e: [14, 20, 25, 32, 40, 50, 60, 72, 85, 100, 110, 125, 135],
  f: [6, 10, 13, 16, 20, 25, 30, 36, 43, 50, 56, 62, 68],
  g: [2, 4, 5, 6, 7, 9, 10, 12, 14, 15, 17, 18, 20],
  h: [0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0],
};

/** The same over the fine ranges. */
export const belowFine: Readonly<Record<string, readonly number[]>> = {
  a: [
    270, 270, 280, 290, 290, 300, 300, 310, 320, 340, 360, 380, 410, 460, 520, 580, 660, 740, 820,
    920, 1050, 1200, 1350, 1500, 1650,
  ],
  b: [
    140, 140, 150, 150, 150, 160, 160, 170, 180, 190, 200, 220, 240, 260, 280, 310, 340, 380, 420,
    480, 540, 600, 680, 760, 840,
  ],
  c: [
    60, 70, 80, 95, 95, 110, 110, 120, 130, 140, 150, 170, 180, 200, 210, 230, 240, 260, 280, 300,
    330, 360, 400, 440, 480,
  ],
};

/** Letters whose shaft lies over the nominal size: how far its lower limit lies over it. */
export const above: Readonly<Record<string, readonly number[]>> = {
  k: [0, 1, 1, 1, 2, 2, 2, 3, 3, 4, 4, 4, 5],
  m: [2, 4, 6, 7, 8, 9, 11, 13, 15, 17, 20, 21, 23],
  n: [4, 8, 10, 12, 15, 17, 20, 23, 27, 31, 34, 37, 40],
  p: [6, 12, 15, 18, 22, 26, 32, 37, 43, 50, 56, 62, 68],
};

/** The same over the fine ranges. */
export const aboveFine: Readonly<Record<string, readonly number[]>> = {
  r: [
    10, 15, 19, 23, 23, 28, 28, 34, 34, 41, 43, 51, 54, 63, 65, 68, 77, 80, 84, 94, 98, 108, 114,
    126, 132,
  ],
  s: [
    14, 19, 23, 28, 28, 35, 35, 43, 43, 53, 59, 71, 79, 92, 100, 108, 122, 130, 140, 158, 170, 190,
    208, 232, 252,
  ],
};
