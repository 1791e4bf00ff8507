export const pdf = {};
