import type { Family } from '../inputs';

export const camAnswers: Family = {};
