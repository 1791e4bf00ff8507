export const account = {};
