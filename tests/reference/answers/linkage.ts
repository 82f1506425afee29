import type { Family } from '../inputs';
import { drawingAnswers } from './drawing';
import { fourBarAnswers } from './four-bar';
import { sliderAnswers } from './slider';
import { straightLineAnswers } from './straight-line';

/** Groups 01 to 06: four-bars, sliders, straight lines and mobility, trammels, copiers, tongs. */
export const linkageAnswers: Family = {
  ...fourBarAnswers,
  ...sliderAnswers,
  ...straightLineAnswers,
  ...drawingAnswers,
};
