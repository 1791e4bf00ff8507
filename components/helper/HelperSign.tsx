import { StyleSheet, View } from 'react-native';
import { pathOf, type CrewMember } from '@/hazard';
import { distance } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import { useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, Facts, Notice, Text } from '../ui';
import { SignatureForm } from '../signing/SignatureForm';
import { placeText, taskText } from '../signing/SigningFacts';
import { SignBlock } from '../signing/SignBlock';
import { ZoneSwatch } from '../worksheet/parts/ZoneSwatch';
import { closenessOf, firstName } from './brief';
import { stayWords } from './CloseBlock';
import { HoldButtons } from './HelperBar';

interface Props {
  record: WorksheetRecord;
  member: CrewMember;
  signer: { id: string; name: string };
  /** Name of the person whose phone it is, where it is not the signer's own. */
  phoneOf: string | undefined;
  /** This phone's own person, while they have no PIN: nothing can be signed. */
  hasNoPin: boolean;
  onAsk: () => void;
  onRefuse: () => void;
  onSigned: () => void;
}

/** Where this person stays: figure and sentence, with the swatch of what they keep outside of. */
function You({ record, member }: Pick<Props, 'record' | 'member'>) {
  const words = useMessages();
  const units = useUnits();
  const closeness = closenessOf(member, record.content, record.assessment);
  const stay = stayWords(closeness, firstName(record.leadName), words);
  if (closeness.figure === null) return <Text variant="answer">{stay}</Text>;
  const zone =
    closeness.kind === 'barricade'
      ? 'barricade'
      : closeness.kind === 'limited'
        ? 'limited'
        : 'restricted';
  return (
    <View style={styles.you}>
      <View style={styles.figure}>
        <ZoneSwatch zone={zone} />
        <Text variant="strong">
          {distance(closeness.figure, units)}
          {closeness.kind !== 'inside' && <Text>{` ${words.helper.orFarther}`}</Text>}
        </Text>
      </View>
      <Text variant="label" weight="400" color="ink2">
        {stay}
      </Text>
    </View>
  );
}

/** The last page of the briefing: what is signed, what it means, PIN and strokes. */
export function HelperSign({ record, member, signer, phoneOf, hasNoPin, ...acts }: Props) {
  const words = useMessages();
  const { signing, helper } = words;
  const lead = firstName(record.leadName);
  const off = pathOf(record.content) === 'off';
  const { rows } = signing;
  return (
    <View>
      <SignBlock title={signing.youSign}>
        <Facts
          facts={[
            { label: rows.worksheet, value: signing.numbered(record.number, record.revision) },
            {
              label: rows.task,
              value: `${taskText(record, words)} ${helper.leads(record.leadName)}`,
            },
            { label: rows.place, value: placeText(record, words) },
            { label: rows.work, value: off ? helper.workOff(lead) : helper.workEnergized },
            { label: rows.you, value: <You record={record} member={member} /> },
          ]}
        />
      </SignBlock>
      <SignBlock title={signing.itMeans}>
        <Text variant="value" weight="500">
          {signing.meaning.acknowledged}
        </Text>
        <HoldButtons onAsk={acts.onAsk} onRefuse={acts.onRefuse} />
        <Text color="ink2">{helper.holds}</Text>
      </SignBlock>
      <SignBlock>
        {hasNoPin && (
          <Notice
            title={signing.noPinTitle}
            action={<Button label={signing.toAccount} href="/account" />}
          >
            {signing.noPinBody}
          </Notice>
        )}
        <SignatureForm
          record={record}
          meaning="acknowledged"
          signer={signer}
          pinLabel={phoneOf === undefined ? helper.ownPin : helper.ownPinOn(firstName(phoneOf))}
          blocked={hasNoPin ? signing.noPinTitle : undefined}
          onSigned={acts.onSigned}
        />
        {phoneOf !== undefined && (
          <>
            <Text color="ink2">{helper.recordSays(firstName(phoneOf))}</Text>
            <Button
              large
              label={helper.giveBack}
              href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
            />
          </>
        )}
      </SignBlock>
    </View>
  );
}

const styles = StyleSheet.create({
  you: { gap: 2 },
  figure: { flexDirection: 'row', alignItems: 'center', gap: space.sm },
});
