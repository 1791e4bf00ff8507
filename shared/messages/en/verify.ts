export const verify = {};
