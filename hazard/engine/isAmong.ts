/** Whether an answer is one of these; one that was not given is none of them. */
export const isAmong = <T>(answer: T | undefined, members: readonly T[]): boolean =>
  (members as readonly (T | undefined)[]).includes(answer);
