/** What went wrong and what to do, by the name of the problem. */
export const problems = {
  'invalid-input': {
    title: 'Some fields are not right.',
    remedy: 'Correct the fields named below.',
  },
  'not-ready': {
    title: 'The worksheet is not ready for this.',
    remedy: 'Clear the stops and open points first.',
  },
  'not-signed-in': { title: 'You are signed out.', remedy: 'Sign in. What you typed is kept.' },
  'wrong-credentials': {
    title: 'The e-mail or the password is wrong.',
    remedy: 'Check both and try again.',
  },
  'not-allowed': {
    title: 'This is not yours to do.',
    remedy: 'Ask the lead, the supervisor or the safety office.',
  },
  'foreign-origin': {
    title: 'The request came from another site.',
    remedy: 'Open Wideberth at its own address and try again.',
  },
  'wrong-password': { title: 'The password is wrong.', remedy: 'Enter it again.' },
  'wrong-pin': {
    title: 'The PIN is wrong.',
    remedy: 'Enter it again. Five wrong ones lock it for 15 minutes.',
  },
  'not-found': {
    title: 'Not found.',
    remedy: 'It is not here, or not yours to see. Go back to the list.',
  },
  'stale-version': {
    title: 'Somebody saved another version first.',
    remedy: 'Look at both and choose what to keep.',
  },
  'wrong-state': {
    title: 'The worksheet has moved on.',
    remedy: 'Load it again and see what it waits for.',
  },
  'hash-mismatch': {
    title: 'What you saw is not the current content.',
    remedy: 'Read it again, then sign.',
  },
  'id-taken': { title: 'This id is taken.', remedy: 'Try again; a new one is made.' },
  conflict: {
    title: 'This conflicts with another record.',
    remedy: 'Look at the other record first.',
  },
  'too-many-requests': { title: 'Too many tries.', remedy: 'Wait, then try again.' },
  'malformed-request': {
    title: 'The server could not read the request.',
    remedy: 'Load the page again and try once more.',
  },
  'took-too-long': {
    title: 'This took too long.',
    remedy: 'Ask for less at once, or try again later.',
  },
  unavailable: {
    title: 'The server cannot reach its database.',
    remedy: 'What you typed is kept on this device. Try again in a minute.',
  },
  unexpected: {
    title: 'The server failed at this.',
    remedy: 'What you typed is kept on this device. Try again; tell the safety office if it stays.',
  },
  /** No answer at all: not a problem document of the server. */
  offline: {
    title: 'No signal.',
    remedy: 'What you typed is kept on this device and sent when there is signal.',
  },
};
