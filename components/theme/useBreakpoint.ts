import { useWindowDimensions } from 'react-native';
import { space } from './tokens';

export type Breakpoint = 'phone' | 'tablet' | 'wide';

export interface Layout {
  breakpoint: Breakpoint;
  width: number;
  height: number;
  isPhone: boolean;
  isTablet: boolean;
  isWide: boolean;
  /** From 1200 the list of sections joins. */
  hasSectionList: boolean;
  /** The page margin in px. */
  margin: number;
}

const TABLET = 600;
const WIDE = 1024;
const SECTION_LIST = 1200;

/** Where the window stands: phone under 600, tablet to 1023, wide from 1024. */
export function useBreakpoint(): Layout {
  const { width, height } = useWindowDimensions();
  const breakpoint = width < TABLET ? 'phone' : width < WIDE ? 'tablet' : 'wide';
  return {
    breakpoint,
    width,
    height,
    isPhone: breakpoint === 'phone',
    isTablet: breakpoint === 'tablet',
    isWide: breakpoint === 'wide',
    hasSectionList: width >= SECTION_LIST,
    margin: breakpoint === 'phone' ? space.md : breakpoint === 'tablet' ? 32 : space.xl,
  };
}
