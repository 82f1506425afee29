import type { Family } from '../inputs';

export const trainAnswers: Family = {};
