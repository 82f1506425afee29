import type { Family } from '../inputs';

export const timberAnswers: Family = {};
