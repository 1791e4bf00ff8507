export const insights = {};
