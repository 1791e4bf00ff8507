/** The topics of the job briefing, and what to say to each. */
export const topics = {
  'job and tasks': { name: 'Job and tasks', say: 'What is done, where, by whom, in which order.' },
  'electrical hazards': {
    name: 'Electrical hazards',
    say: 'The voltage here, every way it can be live, what a shock of it does.',
  },
  'shock boundaries and protection': {
    name: 'Shock boundaries and protection',
    say: 'The limited and the restricted boundary in feet, and the gloves.',
  },
  'arc flash boundary and protection': {
    name: 'Arc flash boundary and protection',
    say: 'Where it lies, and what is worn inside it.',
  },
  'work procedures': {
    name: 'Work procedures',
    say: 'Open, lock, try, test, prove; then hands. Nothing in another order.',
  },
  'special precautions': {
    name: 'Special precautions',
    say: 'Ladder, grounded metal, water, dark, ceiling material, sprinklers and alarms.',
  },
  'energy source controls': {
    name: 'Controls of each source',
    say: 'Where each one is opened, whose locks hang there, who takes them off.',
  },
  'protective equipment': {
    name: 'Protective equipment',
    say: 'Who wears what, looked over and in test.',
  },
  'who may come how close': {
    name: 'Who may come how close',
    say: 'Name by name, until it is proved dead.',
  },
  'emergency plan': {
    name: 'Emergency plan',
    say: 'Who calls, who opens the circuit, who gives CPR, where the AED hangs.',
  },
  'stopping and refusing': {
    name: 'Stopping and refusing',
    say: 'Anyone may stop or say no. Nobody may hold it against them.',
  },
  permit: { name: 'Permit', say: 'What the energized work permit allows, and until when.' },
};
