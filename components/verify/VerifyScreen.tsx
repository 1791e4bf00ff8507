import { useQuery } from '@tanstack/react-query';
import { ActivityIndicator, StyleSheet, View } from 'react-native';
import type { z } from 'zod';
import { dateTimeText } from '@/shared/format';
import type { verifySchema } from '@/shared/record';
import { isProblem } from '../api/ApiProblem';
import { deviceZone } from '../home/clock';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { hashLines } from '../trail/hashGroups';
import { Button, Icon, Notice, Text, TitleBlock, describeFault, type IconName } from '../ui';
import type { Paper } from './papers';
import { VerifyFrame } from './VerifyFrame';
import { verifyQuery } from './verifyQueries';

type Answer = z.infer<typeof verifySchema>;
type Outcome = 'matches' | 'superseded' | 'not';

const ICONS: Readonly<Record<Outcome, IconName>> = {
  matches: 'seal',
  superseded: 'clock',
  not: 'close',
};

function outcomeOf({ matches, superseded }: Answer): Outcome {
  if (!matches) return 'not';
  return superseded === true ? 'superseded' : 'matches';
}

/** One framed panel: mark and sentence, what follows from it below a rule. Never red: red is danger to people. */
function AnswerPanel({ outcome }: { outcome: Outcome }) {
  const { verify } = useMessages();
  const { colors } = useTheme();
  const solid = outcome === 'not';
  const { title, body } = verify[outcome];
  return (
    <View role="status" aria-live="polite" style={[styles.panel, { borderColor: colors.ink }]}>
      <View style={[styles.panelHead, solid && { backgroundColor: colors.ink }]}>
        <Icon name={ICONS[outcome]} size={44} color={solid ? 'paper' : 'ink'} strokeWidth={2.2} />
        <Text variant="figureM" level={1} color={solid ? 'paper' : 'ink'} style={styles.panelTitle}>
          {title}
        </Text>
      </View>
      <View style={[styles.panelBody, { borderTopColor: colors.ink }]}>
        <Text weight="500" style={styles.panelText}>
          {body}
        </Text>
      </View>
    </View>
  );
}

function RecordCells({ paper, answer }: { paper: Paper; answer: Answer }) {
  const { verify, enumerations } = useMessages();
  const locale = useLocale();
  const { state, revision, signedAt, superseded } = answer;
  const word = superseded === true ? verify.superseded.state : state && enumerations.state[state];
  return (
    <View style={styles.cells}>
      <TitleBlock
        cells={[
          { label: verify.worksheet, value: paper.number },
          { label: verify.revision, value: revision === undefined ? '' : String(revision) },
        ]}
      />
      <View style={styles.join}>
        <TitleBlock
          cells={[
            { label: verify.state, value: word ?? '' },
            {
              label: verify.signed,
              value: signedAt === undefined ? '' : dateTimeText(locale, signedAt, deviceZone()),
            },
          ]}
        />
      </View>
    </View>
  );
}

function Code({ hash }: { hash: string }) {
  const { verify } = useMessages();
  const { colors } = useTheme();
  return (
    <View style={[styles.code, { borderTopColor: colors.ink }]}>
      <Text variant="strong" level={2}>
        {verify.code}
      </Text>
      <View aria-label={hash} role="img">
        {hashLines(hash).map((line, index) => (
          <Text key={index} weight="500" style={styles.codeLine}>
            {line}
          </Text>
        ))}
      </View>
    </View>
  );
}

/** What anyone learns who holds a printed number and code. */
export function VerifyScreen({ paper }: { paper: Paper }) {
  const words = useMessages();
  const { verify } = words;
  const locale = useLocale();
  const answer = useQuery(verifyQuery(paper));
  const again = (
    <Button icon="search" large label={verify.another} href="/verify" style={styles.again} />
  );

  if (answer.data === undefined) {
    return (
      <VerifyFrame title={verify.title}>
        {answer.isError ? (
          <>
            <Notice live>
              {isProblem(answer.error, 'too-many-requests')
                ? verify.tooMany
                : describeFault(answer.error, words)}
            </Notice>
            <Button kind="primary" label={words.ui.retry} onPress={() => void answer.refetch()} />
          </>
        ) : (
          <View role="status" style={styles.waiting}>
            <ActivityIndicator />
            <Text color="ink2">{verify.checking}</Text>
          </View>
        )}
        {again}
      </VerifyFrame>
    );
  }

  const outcome = outcomeOf(answer.data);
  const checkedAt = new Date(answer.dataUpdatedAt).toISOString();
  return (
    <VerifyFrame title={verify[outcome].title} hideTitle>
      <Text variant="note" weight="500" color="ink2">
        {verify.checkedAt(paper.number, dateTimeText(locale, checkedAt, deviceZone()))}
      </Text>
      <AnswerPanel outcome={outcome} />
      {outcome !== 'not' && <RecordCells paper={paper} answer={answer.data} />}
      <Code hash={paper.hash} />
      <Text color="ink2">{verify[outcome].compare}</Text>
      {again}
    </VerifyFrame>
  );
}

const styles = StyleSheet.create({
  panel: { borderWidth: rule.strong },
  panelHead: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 14,
    paddingVertical: space.md,
    paddingHorizontal: 14,
  },
  panelTitle: { flexShrink: 1 },
  panelBody: { borderTopWidth: rule.strong, paddingVertical: space.sm, paddingHorizontal: 14 },
  panelText: { fontSize: 18, lineHeight: 25 },
  cells: { gap: 0 },
  join: { marginTop: -rule.strong },
  code: { borderTopWidth: rule.strong, paddingTop: space.md, marginTop: space.xxs, gap: space.xs },
  codeLine: { fontSize: 20, lineHeight: 29, letterSpacing: 0.4 },
  again: { marginTop: space.xxs },
  waiting: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    paddingVertical: space.xl,
  },
});
