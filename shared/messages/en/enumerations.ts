export const enumerations = {};
