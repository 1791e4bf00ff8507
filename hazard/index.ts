export * from './enumerations';
export type * from './content';
export type * from './types';
