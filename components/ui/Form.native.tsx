import type { ReactNode } from 'react';
import { View } from 'react-native';
import { space } from '../theme/tokens';

interface Props {
  /** Only where no heading names the form. */
  label?: string;
  children: ReactNode;
}

/** The fields of one form, under each other. */
export function Form({ label, children }: Props) {
  return (
    <View aria-label={label} style={{ gap: space.md }}>
      {children}
    </View>
  );
}
