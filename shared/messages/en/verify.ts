/** The public check of a printed number and code. */
export const verify = {
  title: 'Check a paper',
  lead: 'Every printed page carries a number and a code of 64 characters. Type both as they stand on the paper.',
  number: 'Worksheet number',
  numberHint: 'Such as 2026-000123',
  code: 'Code on the paper, SHA-256',
  codeHint: '64 characters. Spaces and line ends do not matter.',
  check: 'Check',
  checking: 'Checking the paper',
  another: 'Check another paper',
  notANumber: 'Write the number as year, dash, digits: 2026-000123.',
  codeLength: (count: number) =>
    `${count} of 64 characters. Read the code once more from the paper.`,
  codeLetters: 'Only 0 to 9 and a to f stand in the code. Read it once more from the paper.',
  checkedAt: (number: string, at: string) => `${number}, checked ${at}`,
  matches: {
    title: 'This is the record',
    body: 'This number and this code were signed together. Words on paper can be altered: when it matters, ask the company for its own copy.',
    compare: 'Compare the 64 characters and the revision with your paper.',
  },
  superseded: {
    title: 'Superseded',
    body: 'This was signed, and a later revision replaced it. Do not work from this paper. Ask the lead for the one in force.',
    compare: 'Compare the 64 characters with your paper.',
    state: 'Superseded',
  },
  not: {
    title: 'This is not the record',
    body: 'No signature here carries this number and this code together. The paper was changed, or it was never signed here.',
    compare:
      'Read the code once more from the paper. If it is the same, keep the paper and call the company’s safety office.',
  },
  worksheet: 'Worksheet',
  revision: 'Revision',
  state: 'State',
  signed: 'Signed',
  foot: 'Shown to anyone who holds the paper: no names, no place, no content. It says what was signed, not that anything is without danger. A qualified person decides.',
  tooMany: 'Too many checks from here. Wait a minute, then check again.',
};
