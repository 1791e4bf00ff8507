import { readDate, readMoment } from './moment';
import {
  field,
  fields,
  readFigure,
  readFlag,
  readMany,
  readOne,
  readPositive,
  readText,
  readTexts,
} from './read';
import type { Fields } from './read';

/** Each reads one answer of a section by its name; see `read.ts` for what is not answered. */
export const section = (of: Fields, key: string): Fields => fields(field(of, key));
export const text = (of: Fields, key: string) => readText(field(of, key));
export const flag = (of: Fields, key: string) => readFlag(field(of, key));
export const figure = (of: Fields, key: string) => readFigure(field(of, key));
export const positive = (of: Fields, key: string) => readPositive(field(of, key));
export const date = (of: Fields, key: string) => readDate(field(of, key));
export const moment = (of: Fields, key: string) => readMoment(field(of, key));
export const texts = (of: Fields, key: string) => readTexts(field(of, key));
export const one = <T extends string | number>(of: Fields, key: string, admitted: readonly T[]) =>
  readOne(field(of, key), admitted);
export const many = <T extends string>(of: Fields, key: string, admitted: readonly T[]) =>
  readMany(field(of, key), admitted);
