import type { Family } from '../inputs';

export const beltAnswers: Family = {};
