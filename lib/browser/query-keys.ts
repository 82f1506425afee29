/** The names under which answers of the server are kept in the page. */
export const queryKeys = {
  round: (exerciseId: string) => ['round', exerciseId] as const,
  progress: () => ['progress'] as const,
  classProgress: (classId: string) => ['class-progress', classId] as const,
  waiting: () => ['waiting-answers'] as const,
};
