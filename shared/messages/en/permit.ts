export const permit = {};
