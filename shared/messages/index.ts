export { messages } from './languages';
export type { Messages } from './languages';
export { citationPlace, citationWords } from './citationWords';
export { enumWord } from './enumWord';
export type { EnumGroup } from './enumWord';
export { fieldLabel, findingWords, itemWords, sectionNumberOf } from './findingWords';
export type { FindingWords } from './findingWords';
export { FIRST_USE_ITEMS } from './en/caution';
