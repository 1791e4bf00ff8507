export const helper = {};
