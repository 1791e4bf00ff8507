import { useMemo, useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import type { Finding } from '@/hazard';
import { fieldLabel, findingWords, type FindingWords } from '@/shared/messages';
import { placeOf } from '@/shared/sections';
import { useLocale, useUnits } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space, touch } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Button, Citation, Icon, StateSymbol, Text } from '../../ui';
import { isUnanswered } from './FindingPanels';

const ORDER = { stop: 0, open: 1, caution: 2 } as const;

/** A required field without a rule of its own rests on no clause that would tell more than its label. */
const isRule = ({ code }: Finding) => !code.endsWith('.unanswered');

interface Props {
  findings: readonly Finding[];
  /** Leads to the place of a finding; without it the list only says what is so. */
  onGo?: (finding: Finding) => void;
}

/** Findings that say the same: nineteen things not at hand are one point, which leads to the first. */
function useGroups(findings: readonly Finding[]): { words: FindingWords; all: Finding[] }[] {
  const locale = useLocale();
  const units = useUnits();
  return useMemo(() => {
    const groups = new Map<string, { words: FindingWords; all: Finding[] }>();
    const sorted = [...findings].sort((one, other) => ORDER[one.severity] - ORDER[other.severity]);
    for (const finding of sorted) {
      const words = findingWords(locale, finding, units);
      const key = `${finding.severity} ${finding.code} ${placeOf(finding)} ${words.title}`;
      const group = groups.get(key);
      if (group === undefined) groups.set(key, { words, all: [finding] });
      else group.all.push(finding);
    }
    return [...groups.values()];
  }, [findings, locale, units]);
}

interface PointProps {
  words: FindingWords;
  all: readonly Finding[];
  leads: boolean;
}

function PointWords({ words, all, leads }: PointProps) {
  const [first] = all;
  if (first === undefined) return null;
  return (
    <>
      <StateSymbol state={first.severity} size={18} />
      {leads && (
        <Text variant="strong" style={styles.place}>
          {placeOf(first)}
        </Text>
      )}
      <View style={styles.words}>
        <Text variant="answer" color={leads ? 'blue' : undefined}>
          {all.length > 1 ? `${words.title} (${all.length})` : words.title}
        </Text>
        {!leads && <PointTexts findings={all} />}
        {isRule(first) ? <Citation citation={first.citation} /> : <FieldNames findings={all} />}
      </View>
      {leads && <Icon name="right" color="blue" size={20} />}
    </>
  );
}

function FieldNames({ findings }: { findings: readonly Finding[] }) {
  const locale = useLocale();
  const names = findings.map(({ path }) => fieldLabel(locale, path) ?? path);
  return (
    <Text variant="cite" color="ink2">
      {[...new Set(names)].join(', ')}
    </Text>
  );
}

/** What to do, where no panel at the field says it. */
function PointTexts({ findings }: { findings: readonly Finding[] }) {
  const locale = useLocale();
  const units = useUnits();
  const texts = findings
    .filter((finding) => !isUnanswered(finding))
    .map((finding) => findingWords(locale, finding, units).text);
  return [...new Set(texts)].map((text) => (
    <Text key={text} variant="label" weight="400">
      {text}
    </Text>
  ));
}

/** Stops, open points and cautions, stops first, each with what it rests on. */
export function PointsList({ findings, onGo }: Props) {
  const { colors } = useTheme();
  const row = [styles.row, { borderTopColor: colors.hair }];
  return useGroups(findings).map(({ words, all }) => {
    const [first] = all;
    if (first === undefined) return null;
    const key = `${first.code}${first.path}${JSON.stringify(first.params)}`;
    return onGo === undefined ? (
      <View key={key} style={row}>
        <PointWords words={words} all={all} leads={false} />
      </View>
    ) : (
      <Pressable key={key} role="link" onPress={() => onGo(first)} style={row}>
        <PointWords words={words} all={all} leads />
      </Pressable>
    );
  });
}

/** The same list behind a button that says how long it is. */
export function FoldedPoints(props: Props) {
  const words = useMessages().worksheet;
  const [open, setOpen] = useState(false);
  if (props.findings.length === 0) return null;
  return (
    <View>
      <Button
        label={open ? words.hidePoints : words.showPoints(props.findings.length)}
        icon={open ? 'up' : 'down'}
        aria-expanded={open}
        onPress={() => setOpen(!open)}
      />
      {open && <PointsList {...props} />}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: touch.control,
    paddingVertical: space.xs,
    borderTopWidth: 1,
  },
  place: { width: 32 },
  words: { flex: 1, minWidth: 0, gap: 2 },
});
