export const archive = {};
