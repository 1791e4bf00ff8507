export const items = {};
