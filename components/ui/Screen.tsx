import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { layout, rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { CautionFoot } from './CautionFoot';
import { Header, type BackLink } from './Header';
import { PlacesList } from './PlacesList';
import { ScreenFrame } from './ScreenFrame';
import { Text } from './Text';
import { useDocumentTitle } from './useDocumentTitle';
import { webProps } from './webProps';

export interface ScreenProps {
  /** The first heading, and the name of the browser's tab. */
  title: string;
  subtitle?: string;
  /** Drawn by the screen itself; the title still names the tab. */
  hideTitle?: boolean;
  /** At the right of the title: a count, a button. */
  titleEnd?: ReactNode;
  back?: BackLink;
  saved?: ReactNode;
  headerEnd?: ReactNode;
  /** Key of the place in the header that is open. */
  place?: string;
  /** Under the title, above what scrolls: a title block. */
  head?: ReactNode;
  top?: ReactNode;
  bar?: ReactNode;
  nav?: ReactNode;
  aside?: ReactNode;
  asideWidth?: number;
  /** `column` 756, `helper` 480, `full` everything. */
  width?: 'column' | 'helper' | 'full';
  caution?: 'short' | 'none';
  children?: ReactNode;
}

/** Home leads to the archive by its own words. */
const placesHidden = (place: string) => (place === 'home' ? ['home', 'archive'] : [place]);

const WIDTHS = { column: layout.column, helper: layout.helper, full: undefined } as const;

function TitleRow({
  title,
  subtitle,
  titleEnd,
}: Pick<ScreenProps, 'title' | 'subtitle' | 'titleEnd'>) {
  return (
    <View style={styles.titleRow}>
      <View style={styles.titleWords}>
        <Text variant="title" level={1}>
          {title}
        </Text>
        {subtitle !== undefined && <Text variant="lead">{subtitle}</Text>}
      </View>
      {titleEnd}
    </View>
  );
}

/** One screen: header, title, what scrolls, what stays, and the caution at its foot. */
export function Screen(props: ScreenProps) {
  const { title, width = 'column', caution = 'short', hideTitle } = props;
  const { ui } = useMessages();
  const { margin } = useBreakpoint();
  const { colors } = useTheme();
  useDocumentTitle(title === ui.brand ? title : `${title} · ${ui.brand}`);

  const maxWidth = WIDTHS[width];
  const column = {
    paddingHorizontal: margin,
    maxWidth: maxWidth === undefined ? undefined : maxWidth + 2 * margin,
  };
  return (
    <ScreenFrame
      header={
        <Header back={props.back} saved={props.saved} end={props.headerEnd} place={props.place} />
      }
      top={props.top}
      bar={props.bar}
      nav={props.nav}
      navWidth={layout.sections + margin}
      aside={props.aside}
      asideWidth={props.asideWidth ?? layout.aside}
    >
      <View role="main" {...webProps({ id: 'content', tabIndex: -1 })} style={styles.main}>
        <View style={[styles.column, column]}>
          {hideTitle !== true && <TitleRow {...props} />}
          {props.head}
          {props.children}
          {props.place !== undefined && <PlacesList hidden={placesHidden(props.place)} />}
        </View>
        {caution !== 'none' && (
          <View style={[styles.foot, { borderTopColor: colors.ink }]}>
            <View style={[styles.column, styles.footColumn, column]}>
              <CautionFoot />
            </View>
          </View>
        )}
      </View>
    </ScreenFrame>
  );
}

const styles = StyleSheet.create({
  main: { flexGrow: 1 },
  column: { width: '100%', alignSelf: 'center', paddingBottom: space.xl },
  titleRow: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'flex-end',
    justifyContent: 'space-between',
    gap: space.sm,
    paddingTop: space.sm,
    paddingBottom: space.md,
  },
  titleWords: { flexShrink: 1, gap: 4 },
  foot: { borderTopWidth: rule.strong, marginTop: 'auto' },
  footColumn: { paddingTop: space.md, paddingBottom: space.lg },
});
