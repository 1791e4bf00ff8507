export const fields = {};
