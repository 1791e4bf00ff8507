export const signing = {};
