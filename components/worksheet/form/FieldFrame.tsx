import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../../theme/tokens';
import { FindingPanels } from '../parts/FindingPanels';
import { useShowField } from './shownFields';
import { useFieldState } from './WorksheetFormContext';

/**
 * One field and, directly below it, what the rules say about its answer. It
 * tells the section that its findings have a place, so that none is shown
 * twice and none is lost.
 */
export function FieldFrame({ name, children }: { name: string; children: ReactNode }) {
  const { findings } = useFieldState(name);
  useShowField(name);
  return (
    <View style={styles.frame}>
      {children}
      <FindingPanels findings={findings} />
    </View>
  );
}

const styles = StyleSheet.create({ frame: { gap: space.sm } });
