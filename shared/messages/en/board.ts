/** The supervisor's board: what waits for a signature, and what is in force. */
export const board = {
  title: 'Board',
  loading: 'Loading the board',
  waits: 'Waits for you',
  waitsForSupervisor: 'Waits for a supervisor',
  waiting: (worksheets: number, exceptions: number | undefined) => {
    const sheets = worksheets === 1 ? '1 worksheet' : `${worksheets} worksheets`;
    if (exceptions === undefined) return sheets;
    return `${sheets}, ${exceptions === 1 ? '1 exception' : `${exceptions} exceptions`}`;
  },
  nothingWaits: 'Nothing waits for your signature.',
  nothingWaitsForSupervisor: 'Nothing waits for a supervisor.',
  since: (duration: string) => `Waits ${duration}`,
  revision: (revision: number) => `Revision ${revision}`,
  off: 'Off',
  energized: 'Energized',
  noExceptions: 'No exceptions',
  readingExceptions: 'Reading the exceptions',
  exceptionsNotRead: 'The exceptions could not be read. Open every field.',
  cleared: (place: string) => `Stop, cleared before signing (section ${place})`,
  caution: (title: string) => `Caution: ${title}`,
  asked: (name: string, text: string) => `${name} asked: ${text}`,
  answered: (name: string, text: string) => `${name} answered: ${text}`,
  notAnswered: 'Not answered. It holds your signature.',
  energizedWork: (reason: string) => `Energized work: ${reason}`,
  permit: (number: string) => `Permit ${number}.`,
  noPermit: 'No permit is needed for this task.',
  signedElsewhere: (signer: string, name: string) => `${signer} signed on the session of ${name}`,
  signedElsewhereNote: 'A mail about it went to the signer.',
  withoutSignal: (signer: string) => `${signer} signed without signal`,
  withoutSignalNote: (at: string) => `Signed ${at}, received later.`,
  deviates: (count: number, number: string) =>
    count === 1 ? `1 answer differs from ${number}` : `${count} answers differ from ${number}`,
  deviatesNote: (when: string) => `The last worksheet at this place, ${when}.`,
  deviation: (label: string, was: string, is: string) => `${label}: ${is}, was ${was}`,
  more: (count: number) => (count === 1 ? 'and 1 more' : `and ${count} more`),
  everyField: 'Every field',
  sendBack: 'Send back',
  countersign: 'Countersign',
  readAndSign: 'Read and sign',
  read: 'Read it',
  heldByQuestion: 'A question has no answer yet',

  inForce: 'In force now',
  counts: (inForce: number, over: number, stopped: number) =>
    [
      `${inForce} in force`,
      over > 0 ? `${over} over time` : '',
      stopped > 0 ? `${stopped} stopped` : '',
    ]
      .filter((part) => part !== '')
      .join(', '),
  nothingInForce: 'Nothing is in force.',
  now: (time: string) => `Now, ${time}`,
  crew: (lead: string, others: number) => (others === 0 ? lead : `${lead} and ${others}`),
  bar: {
    energized: 'Energized',
    notProved: 'Not proved dead: treat as live',
    proved: 'Off, proved dead',
    over: (duration: string) => `${duration} over, not closed`,
    stopped: (time: string, name: string) =>
      name === '' ? `Stopped ${time}` : `Stopped ${time} by ${name}`,
    waitsForYou: 'Waits for you',
    waitsForSupervisor: 'Waits for a supervisor',
    waitsForCrew: (count: number) =>
      count === 1 ? 'Waits for 1 of the crew' : `Waits for ${count} of the crew`,
  },
  window: (from: string, to: string) => `${from} to ${to}`,
  zone: (zone: string) => `Site time, ${zone}`,
};
