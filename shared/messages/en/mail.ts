export const mail = {};
