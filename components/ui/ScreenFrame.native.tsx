import type { ReactNode } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { SafeAreaView } from 'react-native-safe-area-context';
import { useTheme } from '../theme/useTheme';

export interface ScreenFrameProps {
  header: ReactNode;
  top?: ReactNode;
  bar?: ReactNode;
  nav?: ReactNode;
  navWidth: number;
  aside?: ReactNode;
  asideWidth: number;
  children: ReactNode;
}

/** On a phone or a tablet the middle scrolls between what stays in view. */
export function ScreenFrame(props: ScreenFrameProps) {
  const { colors } = useTheme();
  const { nav, aside } = props;
  return (
    <SafeAreaView style={[styles.page, { backgroundColor: colors.paper }]}>
      <View style={styles.columns}>
        {nav !== undefined && <ScrollView style={{ maxWidth: props.navWidth }}>{nav}</ScrollView>}
        <ScrollView
          style={styles.middle}
          stickyHeaderIndices={props.top === undefined ? [] : [1]}
          keyboardShouldPersistTaps="handled"
        >
          {props.header}
          <View>{props.top}</View>
          {props.children}
        </ScrollView>
        {aside !== undefined && (
          <ScrollView
            style={[styles.aside, { maxWidth: props.asideWidth, borderLeftColor: colors.ink }]}
          >
            {aside}
          </ScrollView>
        )}
      </View>
      {props.bar}
    </SafeAreaView>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1 },
  columns: { flex: 1, flexDirection: 'row' },
  middle: { flex: 1 },
  aside: { borderLeftWidth: 2 },
});
