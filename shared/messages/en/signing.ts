/** Signing the plan and countersigning it; also the words that every signature shares. */
export const signing = {
  loading: 'Loading the worksheet',
  back: 'Worksheet',
  title: { prepared: 'Sign the plan', countersigned: 'Countersign the plan' },
  asRole: {
    prepared: (name: string) => `${name}, as lead`,
    countersigned: (name: string) => `${name}, as supervisor`,
  },
  youSign: 'You sign this',
  rows: {
    worksheet: 'Worksheet',
    task: 'Task',
    place: 'Place',
    when: 'When',
    work: 'Work',
    permit: 'Permit',
    supply: 'Supply',
    distances: 'Distances',
    who: 'Who',
    you: 'You',
  },
  numbered: (number: string, revision: number) => `${number}, revision ${revision}`,
  off: 'Off, locked, proved dead before hands go on',
  energized: (reason: string) => `Energized: ${reason}`,
  ways: (ways: string, locks: string) =>
    locks === '' ? `Opened: ${ways}` : `Opened: ${ways}. Locks ${locks}`,
  leads: (name: string) => `${name} leads`,
  leadsAndTests: (name: string) => `${name} leads and tests`,
  memberStands: (name: string, closest: string) => `${name}: ${closest}`,
  memberUnknown: 'how close is not answered',
  permitNumbered: (number: string, by: string) => (by === '' ? number : `${number}, by ${by}`),
  permitNotNeeded: 'Not needed for this task',
  zone: {
    restricted: 'restricted',
    limited: 'limited',
    arcFlash: 'arc flash',
    barricade: 'barricade',
  },
  everyField: 'Every field, 12 sections',
  exceptions: 'Look at these first',
  clearedStops: 'Stops that were cleared before the plan was signed',
  noExceptions: 'No caution, and no stop was cleared.',
  openQuestion: 'A question of the crew has no answer yet. It holds the countersignature.',

  itMeans: 'It means',
  meaning: {
    prepared:
      'I prepared this plan. What it says is what I found. I keep to it, and I stop when it no longer fits.',
    acknowledged:
      'I was told what can hurt me here, how close I may come and what I do not do. I could ask, and was answered.',
    countersigned:
      'I read this plan, its cautions and the stops that were cleared. I have no part in the work. I answer for sending this crew.',
  },
  after: {
    crew: (names: string) =>
      `Not in force yet: ${names} acknowledges, then a supervisor countersigns. After that, not proved dead: treat as live.`,
    supervisor:
      'Not in force yet: a supervisor countersigns. After that, not proved dead: treat as live.',
    countersignedOff: (until: string) =>
      `With it the plan is in force until ${until}. Not proved dead: treat as live.`,
    countersignedEnergized: (until: string) =>
      `With it the plan is in force until ${until}. Every part is live the whole time.`,
  },

  pinNote: 'Nobody else knows it.',
  signature: 'Your signature',
  content: 'Content, SHA-256',
  allOfIt: 'All of it',
  lessOfIt: 'Short form',
  button: {
    prepared: 'Sign as lead',
    acknowledged: 'Sign',
    countersigned: 'Countersign as supervisor',
  },
  missing: {
    digits: (count: number) =>
      count === 1 ? '1 digit of the PIN is missing' : `${count} digits of the PIN are missing`,
    strokes: 'The signature is missing',
    both: 'PIN and signature are missing',
    question: 'A question has no answer yet',
    points: (count: number) =>
      count === 1 ? '1 point is not cleared' : `${count} points are not cleared`,
    notSent: 'What was typed is not sent yet',
    state: 'It does not wait for this signature',
  },
  fixed: (revision: number) =>
    `Once signed, revision ${revision} cannot be changed. A change makes revision ${revision + 1} and asks everyone again.`,

  unsentTitle: 'What you typed here has not reached the server.',
  unsentBody: 'A signature holds what the server has. Go back, wait until it says Sent, then sign.',
  backToBoard: 'Back to what waits',
  backToWorksheet: 'Back to the worksheet',
  notReadyTitle: 'Not ready to sign.',
  notReadyBody: 'These points stand. Clear them in the worksheet, then sign.',
  notAwaited: {
    title: 'This signature is not waited for.',
    body: (state: string) => `The worksheet stands at: ${state}.`,
  },
  noPinTitle: 'You have no signing PIN.',
  noPinBody: 'Set one in your account, then come back.',
  toAccount: 'To your account',

  wrongPin: 'The PIN is wrong. Enter it again. Five wrong ones lock it for 15 minutes.',
  pinLocked: (minutes: number) =>
    minutes === 1
      ? 'Too many wrong PINs. Wait 1 minute, then enter it again. A mail about it was sent.'
      : `Too many wrong PINs. Wait ${minutes} minutes, then enter it again. A mail about it was sent.`,
  changedTitle: 'What you read is not the current content.',
  changedBody: 'It was changed meanwhile. Read it again, then sign. Nothing was signed.',
  readItAgain: 'Read it again',
  movedTitle: 'The worksheet has moved on.',
  movedBody: 'It no longer waits for this signature. Nothing was signed.',
  conflictTitle: 'It cannot be signed as it stands.',
  conflict: {
    'no-account':
      'Somebody on the crew has no account and cannot sign. Change the crew in section 10.',
    'lead-not-named': 'The crew does not name the lead as lead. Correct section 10.',
    other:
      'The register or a question stands against it. Open the worksheet, look at crew, gloves and questions.',
  },
  offline:
    'No signal. Nothing was signed; PIN and strokes stay here. Go where there is signal, then press again.',

  signedTitle: (time: string) => `Signed ${time}`,
  signedBody: {
    crew: (names: string) => `Not in force yet. Next: ${names}.`,
    supervisor: 'Not in force yet. Next: a supervisor countersigns.',
    inForceOff: 'In force. Not proved dead: treat as live.',
    inForceEnergized: 'In force. Every part is live.',
  },
};
