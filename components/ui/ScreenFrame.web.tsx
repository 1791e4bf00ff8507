import type { ReactNode } from 'react';
import { StyleSheet, View, type ViewStyle } from 'react-native';
import { useTheme } from '../theme/useTheme';

/** React Native's types know neither `sticky` nor viewport units, which the web target takes. */
const web = (style: Record<string, string | number>): ViewStyle => style;

export interface ScreenFrameProps {
  header: ReactNode;
  /** Stays in view at the top: the distance strip. */
  top?: ReactNode;
  /** Stays in view at the foot: the verdict bar. */
  bar?: ReactNode;
  /** A list at the left that keeps its place. */
  nav?: ReactNode;
  navWidth: number;
  /** The right column, a scroll area of its own. */
  aside?: ReactNode;
  asideWidth: number;
  children: ReactNode;
}

/** On the web the document itself scrolls, so that a phone's own bars fold away and a page prints whole. */
export function ScreenFrame(props: ScreenFrameProps) {
  const { colors } = useTheme();
  const ground = { backgroundColor: colors.paper };
  const edge = { borderColor: colors.ink };
  const { nav, aside } = props;
  return (
    <View style={[styles.page, ground]}>
      {props.header}
      <View style={styles.columns}>
        {nav !== undefined && <View style={[styles.nav, { width: props.navWidth }]}>{nav}</View>}
        <View style={styles.middle}>
          {props.top !== undefined && <View style={[styles.top, ground]}>{props.top}</View>}
          {props.children}
        </View>
        {aside !== undefined && (
          <View
            role="complementary"
            style={[styles.aside, ground, edge, { width: props.asideWidth }]}
          >
            {aside}
          </View>
        )}
      </View>
      {props.bar !== undefined && (
        <View role="contentinfo" style={[styles.bar, ground]}>
          {props.bar}
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  page: web({ minHeight: '100vh' }),
  columns: { flexDirection: 'row', alignItems: 'stretch', flexGrow: 1 },
  middle: { flex: 1, minWidth: 0 },
  top: web({ position: 'sticky', top: 0, zIndex: 2 }),
  bar: web({ position: 'sticky', bottom: 0, zIndex: 3 }),
  nav: web({
    position: 'sticky',
    top: 0,
    alignSelf: 'flex-start',
    maxHeight: '100vh',
    overflowY: 'auto',
  }),
  aside: web({
    position: 'sticky',
    top: 0,
    alignSelf: 'flex-start',
    height: '100vh',
    overflowY: 'auto',
    borderLeftWidth: 2,
  }),
});
