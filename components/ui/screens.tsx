import { ActivityIndicator, StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Button } from './Button';
import { describeFault, referenceOf } from './faults';
import { Screen } from './Screen';
import { useShell } from './shell';
import { Text } from './Text';

/** While the first answer is on its way. */
export function LoadingScreen({ label }: { label?: string }) {
  const { ui } = useMessages();
  const { colors } = useTheme();
  const said = label ?? ui.loading;
  return (
    <Screen title={said} hideTitle>
      <View role="status" aria-live="polite" style={styles.loading}>
        <ActivityIndicator color={colors.ink} />
        <Text color="ink2">{said}</Text>
      </View>
    </Screen>
  );
}

/** No signal, and nothing kept on this device to show. */
export function OfflineScreen({ what, onRetry }: { what: string; onRetry?: () => void }) {
  const { ui } = useMessages();
  const { homeHref } = useShell();
  return (
    <Screen title={ui.offline.title}>
      <View style={styles.body}>
        <Text>{ui.offline.body(what)}</Text>
        {onRetry !== undefined && <Button kind="primary" label={ui.retry} onPress={onRetry} />}
        {homeHref !== undefined && <Button label={ui.notFound.home} href={homeHref} />}
      </View>
    </Screen>
  );
}

/** A first answer that failed; what was shown before stays on the screen instead of this. */
export function ProblemScreen({ error, onRetry }: { error: unknown; onRetry?: () => void }) {
  const messages = useMessages();
  const { ui } = messages;
  const { homeHref } = useShell();
  const reference = referenceOf(error);
  return (
    <Screen title={ui.problem.title}>
      <View role="alert" style={styles.body}>
        <Text>{describeFault(error, messages)}</Text>
        {reference !== undefined && (
          <Text variant="label" weight="400" color="ink2">
            {ui.problem.reference(reference)}
          </Text>
        )}
        {onRetry !== undefined && <Button kind="primary" label={ui.retry} onPress={onRetry} />}
        {homeHref !== undefined && <Button label={ui.notFound.home} href={homeHref} />}
      </View>
    </Screen>
  );
}

/** Nothing at this address, or nothing for this person. */
export function NotFoundScreen({ what }: { what?: string }) {
  const { ui } = useMessages();
  const { homeHref } = useShell();
  return (
    <Screen title={ui.notFound.title(what ?? ui.notFound.page)}>
      <View style={styles.body}>
        <Text>{ui.notFound.body}</Text>
        <Button label={ui.notFound.home} href={homeHref ?? '/'} />
      </View>
    </Screen>
  );
}

const styles = StyleSheet.create({
  loading: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    paddingVertical: space.xxl,
  },
  body: { gap: space.md, maxWidth: 560, paddingTop: space.xs },
});
