import { useSetAtom } from 'jotai';
import { lazy, Suspense, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { deviceLocaleAtom } from '../api/deviceChoices';
import { LanguageSwitch } from '../i18n/LanguageSwitch';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { CautionFoot, Mark, Text, useDocumentTitle, webProps } from '../ui';

/** Read only on a wide screen: a phone that signs in does not wait for the tables. */
const ExampleFigure = lazy(() =>
  import('./ExampleFigure').then((module) => ({ default: module.ExampleFigure })),
);

interface Props {
  /** Names the browser's tab, and the form beside the figure on a wide screen. */
  title: string;
  /** On a phone the mark and the purpose lead on the first screen only. */
  purpose?: boolean;
  /** The last lines of the form's column. */
  foot?: string;
  children: ReactNode;
}

function Language() {
  const setLocale = useSetAtom(deviceLocaleAtom);
  return (
    <View style={styles.language}>
      <LanguageSwitch value={useLocale()} onChange={setLocale} />
    </View>
  );
}

function Purpose({ large }: { large: boolean }) {
  const { account, ui } = useMessages();
  return (
    <View style={large ? styles.purposeWide : styles.purpose}>
      <View style={large ? styles.brandWide : styles.brand}>
        <Mark width={large ? 88 : 84} />
        <Text
          level={1}
          variant="figureL"
          weight="600"
          style={large ? styles.nameWide : styles.name}
        >
          {ui.brand}
        </Text>
      </View>
      <Text variant="lead" weight="500" style={large && styles.taglineWide}>
        {account.tagline}
      </Text>
    </View>
  );
}

/** The page before sign-in: what the tool is for, and one form. */
export function SignedOutFrame({ title, purpose = false, foot, children }: Props) {
  const { isPhone, isWide, margin } = useBreakpoint();
  const { colors } = useTheme();
  const { ui } = useMessages();
  useDocumentTitle(`${title} · ${ui.brand}`);
  const line = { borderTopWidth: rule.strong, borderTopColor: colors.ink };
  const main = webProps({ id: 'content', tabIndex: -1 });

  if (isWide) {
    return (
      <View style={[styles.page, styles.wide, { backgroundColor: colors.paper }]}>
        <View role="complementary" style={styles.left}>
          <Purpose large />
          <View style={[styles.figure, line]}>
            <Suspense fallback={null}>
              <ExampleFigure />
            </Suspense>
          </View>
          <View style={[styles.wideFoot, line]}>
            <CautionFoot />
          </View>
        </View>
        <View role="main" {...main} style={[styles.right, { borderLeftColor: colors.ink }]}>
          <Language />
          <View style={styles.formWide}>
            <Text variant="title" level={2}>
              {title}
            </Text>
            {children}
          </View>
          {foot !== undefined && (
            <Text variant="note" color="ink2">
              {foot}
            </Text>
          )}
        </View>
      </View>
    );
  }
  const column = [styles.column, { paddingHorizontal: margin }, !isPhone && styles.columnTablet];
  return (
    <View style={[styles.page, { backgroundColor: colors.paper }]}>
      <View role="main" {...main} style={column}>
        <Language />
        {purpose ? <Purpose large={false} /> : <Mark width={64} />}
        <View style={[styles.form, purpose && line]}>
          {(!purpose || !isPhone) && (
            <Text variant="title" level={purpose ? 2 : 1}>
              {title}
            </Text>
          )}
          {children}
          {foot !== undefined && (
            <Text variant="label" weight="400" color="ink2">
              {foot}
            </Text>
          )}
        </View>
      </View>
      <View role="contentinfo" style={[styles.foot, line]}>
        <View style={column}>
          <CautionFoot />
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flexGrow: 1, minHeight: '100%' },
  wide: { flexDirection: 'row', alignItems: 'stretch' },
  left: { flex: 2, minWidth: 0, paddingHorizontal: 56, paddingVertical: space.xl, gap: space.md },
  right: {
    flex: 1,
    minWidth: 400,
    maxWidth: 560,
    borderLeftWidth: rule.strong,
    paddingHorizontal: 44,
    paddingVertical: 40,
    gap: space.lg,
    justifyContent: 'space-between',
  },
  formWide: { gap: space.lg, flex: 1, paddingTop: space.xxl },
  figure: { paddingTop: space.md, flex: 1 },
  wideFoot: { paddingTop: space.sm },
  column: {
    width: '100%',
    alignSelf: 'center',
    paddingTop: space.sm,
    paddingBottom: space.lg,
    gap: space.md,
  },
  columnTablet: { maxWidth: 560 },
  language: { alignSelf: 'flex-end' },
  purpose: { gap: space.sm, paddingTop: space.xs },
  purposeWide: { gap: space.md },
  brand: { gap: space.xs },
  brandWide: { flexDirection: 'row', alignItems: 'center', gap: space.lg },
  name: { fontSize: 44, lineHeight: 52, letterSpacing: -0.22 },
  nameWide: { fontSize: 52, lineHeight: 60, letterSpacing: -0.26 },
  taglineWide: { fontSize: 24, lineHeight: 32, maxWidth: 640 },
  form: { gap: space.md, paddingTop: space.lg, marginTop: space.xxs },
  foot: { marginTop: 'auto' },
});
