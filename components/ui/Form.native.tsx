import type { ReactNode } from 'react';
import { View } from 'react-native';
import { space } from '../theme/tokens';

interface Props {
  children: ReactNode;
}

/** The fields of one form, under each other. */
export function Form({ children }: Props) {
  return <View style={{ gap: space.md }}>{children}</View>;
}
