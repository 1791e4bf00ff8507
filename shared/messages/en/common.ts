export const common = {};
