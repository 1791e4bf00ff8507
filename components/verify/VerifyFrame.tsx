import { useSetAtom } from 'jotai';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { deviceLocaleAtom } from '../api/deviceChoices';
import { usePatchSession, useSession } from '../api/session';
import { LanguageSwitch } from '../i18n/LanguageSwitch';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Screen, Text } from '../ui';

/** Whoever is signed in changes their own language; anybody else that of this device. */
function Language() {
  const setDeviceLocale = useSetAtom(deviceLocaleAtom);
  const session = useSession();
  const patch = usePatchSession();
  return (
    <LanguageSwitch
      value={useLocale()}
      onChange={(locale) => {
        setDeviceLocale(locale);
        if (session.data) patch.mutate({ locale });
      }}
    />
  );
}

interface Props {
  title: string;
  hideTitle?: boolean;
  children: ReactNode;
}

/** The public page: nobody needs an account, and nothing personal stands on it. */
export function VerifyFrame({ title, hideTitle, children }: Props) {
  const { verify } = useMessages();
  const { colors } = useTheme();
  const { isPhone, margin } = useBreakpoint();
  return (
    <Screen
      title={title}
      hideTitle={hideTitle}
      width="helper"
      caution="none"
      headerEnd={
        isPhone ? (
          <Language />
        ) : (
          <View style={styles.end}>
            <Language />
          </View>
        )
      }
    >
      <View style={[styles.body, !isPhone && styles.wide]}>{children}</View>
      <View
        style={[
          styles.foot,
          { borderTopColor: colors.ink },
          isPhone && { marginHorizontal: -margin, paddingHorizontal: margin },
        ]}
      >
        <Text color="ink2">{verify.foot}</Text>
      </View>
    </Screen>
  );
}

const styles = StyleSheet.create({
  end: { marginLeft: 'auto' },
  body: { gap: space.md, paddingTop: space.xs },
  wide: { paddingTop: space.lg },
  foot: { borderTopWidth: rule.strong, marginTop: space.xl, paddingTop: space.md },
});
