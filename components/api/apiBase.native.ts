/** A phone app is built for one deployment. */
export const apiBase = `${process.env.EXPO_PUBLIC_SERVER_URL ?? 'http://127.0.0.1:3000'}/api`;
