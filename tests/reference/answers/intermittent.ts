import type { Family } from '../inputs';

export const intermittentAnswers: Family = {};
