export const register = {};
