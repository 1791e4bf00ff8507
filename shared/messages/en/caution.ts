export const caution = {};
