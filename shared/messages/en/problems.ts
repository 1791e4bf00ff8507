export const problems = {};
