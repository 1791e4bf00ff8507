import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import { pathOf, type CrewMember } from '@/hazard';
import { distance, timeText } from '@/shared/format';
import type { Messages } from '@/shared/messages';
import type { WorksheetRecord } from '@/shared/record';
import { useUnits } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Citation, Notice, Text } from '../ui';
import { arcFlashBeyond, closenessOf, firstName, type Closeness } from './brief';
import { HelperStrip } from './HelperStrip';

/** The sentence that goes with the figure. */
export function stayWords({ kind }: Closeness, lead: string, { helper }: Messages): string {
  switch (kind) {
    case 'unknown':
      return helper.noFigureBody;
    case 'escorted':
      return helper.stay.escorted(lead);
    default:
      return helper.stay[kind];
  }
}

/** How close this person may come: one figure, one sentence, the picture. */
export function CloseBlock({ record, member }: { record: WorksheetRecord; member: CrewMember }) {
  const words = useMessages();
  const units = useUnits();
  const said = words.helper;
  const { content, assessment } = record;
  const lead = firstName(record.leadName);
  const closeness = useMemo(
    () => closenessOf(member, content, assessment),
    [member, content, assessment],
  );
  const arcFlash = arcFlashBeyond(closeness, assessment);
  const off = pathOf(content) === 'off';
  const proof = record.proofs.at(-1);
  const figure =
    closeness.figure === null
      ? closeness.kind === 'unknown'
        ? said.noFigure
        : words.worksheet.avoidContact
      : distance(closeness.figure, units);
  const stay = stayWords(closeness, lead, words);
  const cited = [assessment.boundaries?.citation, assessment.barricade?.citation].filter(
    (each) => each !== undefined,
  );
  return (
    <View style={styles.block}>
      {off && record.proved && proof !== undefined && (
        <Notice>{said.ended(timeText(proof.at, record.timeZone))}</Notice>
      )}
      <View>
        <Text variant="figureL">{figure}</Text>
        <Text variant="value">{stay}</Text>
        <Text color="ink2">
          {closeness.kind === 'barricade'
            ? said.stayNote.barricade(lead)
            : off
              ? said.stayNote.off(lead)
              : said.stayNote.energized}
        </Text>
        {arcFlash !== null && (
          <Text variant="strong">{said.stayNote.arcFlash(distance(arcFlash, units))}</Text>
        )}
      </View>
      <HelperStrip
        record={record}
        closeness={closeness}
        label={said.stripLabel(`${figure}. ${stay}`)}
      />
      {cited.length > 0 && <Citation citation={cited} />}
    </View>
  );
}

const styles = StyleSheet.create({ block: { gap: space.sm } });
