import type { Family } from '../inputs';

export const couplingAnswers: Family = {};
