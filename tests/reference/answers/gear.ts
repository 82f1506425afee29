import type { Family } from '../inputs';

export const gearAnswers: Family = {};
