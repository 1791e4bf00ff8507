/** What went wrong and what to do, by the name of the problem. */
export const problems = {
  'invalid-input': { title: 'Some fields are not right.', todo: 'Correct the fields named below.' },
  'not-ready': {
    title: 'The worksheet is not ready for this.',
    todo: 'Clear the stops and open points first.',
  },
  'not-signed-in': { title: 'You are signed out.', todo: 'Sign in. What you typed is kept.' },
  'wrong-credentials': {
    title: 'The e-mail or the password is wrong.',
    todo: 'Check both and try again.',
  },
  'not-allowed': {
    title: 'This is not yours to do.',
    todo: 'Ask the lead, the supervisor or the safety office.',
  },
  'foreign-origin': {
    title: 'The request came from another site.',
    todo: 'Open Wideberth at its own address and try again.',
  },
  'wrong-password': { title: 'The password is wrong.', todo: 'Enter it again.' },
  'wrong-pin': {
    title: 'The PIN is wrong.',
    todo: 'Enter it again. Five wrong ones lock it for 15 minutes.',
  },
  'not-found': {
    title: 'Not found.',
    todo: 'It is not here, or not yours to see. Go back to the list.',
  },
  'stale-version': {
    title: 'Somebody saved another version first.',
    todo: 'Look at both and choose what to keep.',
  },
  'wrong-state': {
    title: 'The worksheet has moved on.',
    todo: 'Load it again and see what it waits for.',
  },
  'hash-mismatch': {
    title: 'What you saw is not the current content.',
    todo: 'Read it again, then sign.',
  },
  'id-taken': { title: 'This id is taken.', todo: 'Try again; a new one is made.' },
  conflict: {
    title: 'This conflicts with another record.',
    todo: 'Look at the other record first.',
  },
  'too-many-requests': { title: 'Too many tries.', todo: 'Wait, then try again.' },
  'malformed-request': {
    title: 'The server could not read the request.',
    todo: 'Load the page again and try once more.',
  },
  'took-too-long': {
    title: 'This took too long.',
    todo: 'Ask for less at once, or try again later.',
  },
  unavailable: {
    title: 'The server cannot reach its database.',
    todo: 'What you typed is kept on this device. Try again in a minute.',
  },
  unexpected: {
    title: 'The server failed at this.',
    todo: 'What you typed is kept on this device. Try again; tell the safety office if it stays.',
  },
  /** No answer at all: not a problem document of the server. */
  offline: {
    title: 'No signal.',
    todo: 'What you typed is kept on this device and sent when there is signal.',
  },
};
