/** Two taps stop the work: Stop, then a reason. */
export const stop = {
  loading: 'Loading the worksheet',
  title: 'Stop the work',
  back: 'Worksheet',
  body: 'One press stops it for everyone. Say it out loud as well. Nobody may hold it against you.',
  reasons: 'What is it?',
  own: 'In your own words',
  ownLabel: 'Why the work stops',
  ownSend: 'Stop the work',
  ownEmpty: 'Write why first',
  noReason: 'Back, it goes on',
  sending: 'Stopping',
  notSentTitle: 'Say stop out loud. The work stops now.',
  notSentBody:
    'No signal: the record does not know it yet. It is kept here and sent as soon as there is signal.',
  sendAgain: 'Send it again',
  stoppedTitle: 'Stopped: hands off',
  stoppedBody: 'Everyone on it is told. Locks stay on. It needs a new revision before it goes on.',
  stoppedLine: (reason: string, name: string, time: string) => `“${reason}” ${name}, ${time}`,
  toWorksheet: 'To the worksheet',
  notHereTitle: 'There is nothing to stop in the record.',
  notHereBody: (state: string) =>
    `The worksheet stands at: ${state}. If somebody works here, say stop out loud.`,
};
