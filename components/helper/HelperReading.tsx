import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { timeText } from '@/shared/format';
import { useUser } from '../api/session';
import { useMessages } from '../i18n/useMessages';
import { placeText, taskText } from '../signing/SigningFacts';
import { rule, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Button, Notice, Screen, Text } from '../ui';
import { Questions } from '../worksheet/parts/Questions';
import { firstName, groundedInReach } from './brief';
import { CloseBlock } from './CloseBlock';
import { DoNots, Dos } from './DoLists';
import { Cautions, Emergency } from './EndBlocks';
import { BAR_COVERS, HelperBar } from './HelperBar';
import type { HelperPage, HelperPageProps } from './helperPage';
import { HurtBlock } from './HurtBlock';
import { useSeen } from './useSeen';

function Block({ title, children }: { title: string; children: ReactNode }) {
  const { colors } = useTheme();
  return (
    <View style={[styles.block, { borderTopColor: colors.ink }]}>
      <Text variant="section" level={2}>
        {title}
      </Text>
      {children}
    </View>
  );
}

interface Props extends HelperPageProps {
  asked: boolean;
  /** Once the end was on screen it need not be sought again after a question. */
  read: boolean;
  onRead: () => void;
}

/** Why the signature cannot be given now. */
function useReason({ record, member, read }: Props, seen: boolean): string | undefined {
  const said = useMessages().helper;
  const signature = record.signatures.find(
    (each) => each.revision === record.revision && each.signer.id === member.userId,
  );
  if (signature !== undefined) return said.signed(timeText(signature.signedAt, record.timeZone));
  if (!record.actions.includes('sign:acknowledged')) return said.notAwaited;
  return seen || read ? undefined : said.readToEnd;
}

/** The briefing: one scroll of what can hurt, how close, what not to do and what to do. */
export function HelperReading(props: Props) {
  const { record, member, onPage, asked, headerEnd, onRead } = props;
  const words = useMessages();
  const said = words.helper;
  const user = useUser();
  const { ref, seen } = useSeen(BAR_COVERS);
  const reason = useReason(props, seen);
  const name = firstName(member.name ?? '');
  const leave = (page: HelperPage) => {
    if (seen) onRead();
    onPage(page);
  };
  const isCeiling = groundedInReach(record.content).includes('ceiling grid');
  return (
    <Screen
      title={(isCeiling ? said.titleCeiling : said.title)(name)}
      subtitle={`${taskText(record, words)} ${placeText(record, words)}. ${said.leads(record.leadName)}`}
      headerEnd={headerEnd}
      width="helper"
      bar={
        <HelperBar
          reason={reason}
          onAsk={() => leave('ask')}
          onRefuse={() => leave('refuse')}
          onUnderstand={() => leave('sign')}
        />
      }
    >
      {asked && (
        <Notice icon="sent" live>
          {said.asked}
        </Notice>
      )}
      <Questions record={record} />
      <Block title={said.canHurt}>
        <HurtBlock record={record} />
      </Block>
      <Block title={said.howClose}>
        <CloseBlock record={record} member={member} />
      </Block>
      <Block title={said.doNot}>
        <DoNots record={record} member={member} />
      </Block>
      <Block title={said.do}>
        <Dos record={record} member={member} />
      </Block>
      <View style={styles.end}>
        <Cautions record={record} />
        <Emergency record={record} />
        <View ref={ref} testID="briefing-end">
          <Text variant="label" color="ink2">
            {said.theEnd}
          </Text>
        </View>
        {user.id !== member.userId && (
          <Button
            label={said.giveBack}
            href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
          />
        )}
      </View>
    </Screen>
  );
}

const styles = StyleSheet.create({
  block: {
    borderTopWidth: rule.strong,
    paddingTop: space.sm,
    paddingBottom: space.lg,
    gap: space.xs,
  },
  end: { gap: space.md, paddingBottom: space.md },
});
