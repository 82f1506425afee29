import type { Family } from '../inputs';

export const linkageAnswers: Family = {};
