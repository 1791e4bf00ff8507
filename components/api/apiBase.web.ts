/** The web app is served by the server that it asks. */
export const apiBase = '/api';
