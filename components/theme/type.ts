import type { TextStyle } from 'react-native';
import type { FontWeight } from './fonts';

export interface TypeStyle {
  size: number;
  line: number;
  weight: FontWeight;
  /** em */
  tracking?: number;
}

/** The type scale. Nothing on a phone is smaller than `label`, except `cite`. */
export const typeScale = {
  figureXl: { size: 76, line: 66, weight: '700' },
  figureL: { size: 40, line: 44, weight: '700' },
  figureM: { size: 28, line: 32, weight: '700' },
  title: { size: 31, line: 35, weight: '700', tracking: -0.01 },
  section: { size: 24, line: 30, weight: '600' },
  signal: { size: 20, line: 24, weight: '700' },
  value: { size: 19, line: 26, weight: '600' },
  lead: { size: 19, line: 26, weight: '400' },
  body: { size: 17, line: 24, weight: '400' },
  answer: { size: 17, line: 24, weight: '500' },
  strong: { size: 17, line: 24, weight: '600' },
  note: { size: 16, line: 22, weight: '400' },
  label: { size: 15, line: 20, weight: '500' },
  cite: { size: 14, line: 19, weight: '400', tracking: 0.015 },
  smallCaps: { size: 16, line: 18, weight: '600', tracking: 0.05 },
} as const satisfies Record<string, TypeStyle>;

export type TextVariant = keyof typeof typeScale;

/** Barlow's digits are proportional unless asked: figures under each other must line up. */
export const tabular: TextStyle = { fontVariant: ['tabular-nums'] };
