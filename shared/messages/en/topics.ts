export const topics = {};
