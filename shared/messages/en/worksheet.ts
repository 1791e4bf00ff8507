export const worksheet = {};
