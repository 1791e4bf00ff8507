import { useSetAtom } from 'jotai';
import { useFieldArray } from 'react-hook-form';
import { View, StyleSheet } from 'react-native';
import { EGRESS_REACHES, EGRESS_SUPPLIES } from '@/hazard';
import { list } from '@/shared/format';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { Button, Text } from '../../ui';
import { FieldChoice, FieldMulti, FieldText } from '../form/fields';
import { wordOf } from '../form/fieldWords';
import { useSetField } from '../form/useSetField';
import { useShowField } from '../form/shownFields';
import { useFieldState, useWorksheetForm } from '../form/WorksheetFormContext';
import { FindingPanels } from '../parts/FindingPanels';
import { useLastHere } from '../lastHere';
import { SectionFrame } from '../parts/SectionFrame';
import { Suggestions } from '../parts/Suggestions';
import { openSectionsAtom } from '../worksheetAtoms';
import { SourceRow } from './SourceRow';

const MOST_SOURCES = 40;

/** The next free id of a source: `s1`, `s2` … An id is never used twice in one worksheet. */
function nextId(ids: readonly (string | undefined)[]): string {
  const numbers = ids.map((id) => Number(/^s(\d+)$/.exec(id ?? '')?.[1] ?? 0));
  return `s${Math.max(0, ...numbers) + 1}`;
}

function SourcesSummary() {
  const { content } = useWorksheetForm();
  return (
    <View>
      {(content.sources ?? []).map((source, index) => (
        <SourceRow key={source.id ?? index} index={index} readOnly />
      ))}
    </View>
  );
}

/** Findings about the list itself: none listed, one that the answers ask for is missing. */
function ListFindings() {
  const { findings } = useFieldState('sources');
  useShowField('sources');
  return <FindingPanels findings={findings} />;
}

function Egress() {
  const words = useMessages();
  const { content, site } = useWorksheetForm();
  const named = (content.egressSupply ?? []).some(
    (supply) => supply !== 'none after checking' && supply !== 'unknown',
  );
  const reaches = content.egressReaches !== 'other equipment only, checked';
  return (
    <>
      <FieldMulti
        name="egressSupply"
        values={EGRESS_SUPPLIES}
        group="egressSupply"
        alone={['none after checking', 'unknown']}
      />
      <EgressSuggestion />
      {named && <FieldChoice name="egressReaches" values={EGRESS_REACHES} group="egressReaches" />}
      {named && reaches && (
        <>
          <FieldText name="egress.toldTo" />
          <DeskSuggestion desk={site?.deskToTell} from={words.worksheet.fromSite} />
          <FieldText name="egress.interim" />
        </>
      )}
    </>
  );
}

/** What fed the egress lighting the last time, to be confirmed; what was not known then is not offered. */
function EgressSuggestion() {
  const words = useMessages();
  const locale = useLocale();
  const { content } = useWorksheetForm();
  const last = useLastHere();
  const take = useSetField('egressSupply');
  const before = last?.content.egressSupply ?? [];
  const answered = (content.egressSupply ?? []).length > 0;
  if (answered || before.length === 0 || before.includes('unknown')) return null;
  const value = list(
    locale,
    before.map((supply) => wordOf(words, 'egressSupply', supply)),
  );
  return <Suggestions from={last?.from ?? ''} values={[value]} onTake={() => take(before)} />;
}

function DeskSuggestion({ desk, from }: { desk: string | undefined; from: string }) {
  const { content } = useWorksheetForm();
  const take = useSetField('egress.toldTo');
  const values = desk === undefined || desk === '' || content.egress?.toldTo === desk ? [] : [desk];
  return <Suggestions from={from} values={values} onTake={take} />;
}

/** 3. Every way it can be live, and how each is opened and held. */
export function SourcesSection() {
  const words = useMessages();
  const { content, record } = useWorksheetForm();
  const setOpen = useSetAtom(openSectionsAtom);
  const { fields, append, remove } = useFieldArray({ name: 'sources', keyName: 'key' });
  const sources = content.sources ?? [];
  const held = sources.filter(
    ({ openedAt, held: how }) =>
      openedAt !== undefined && openedAt !== 'none' && how !== undefined && how !== 'none',
  ).length;
  const addSource = () => {
    const id = nextId(sources.map((source) => source.id));
    append({ id });
    // A new way is open to be answered; one that was there before opens when it is pressed.
    setOpen((before) => ({ ...before, [`${record.id}/source/${id}`]: true }));
  };
  return (
    <SectionFrame
      section="sources"
      folded={<SourcesSummary />}
      detail={sources.length === 0 ? undefined : words.worksheet.openAndHeld(held, sources.length)}
    >
      <Egress />
      <View>
        {fields.map((field, index) => (
          <SourceRow key={field.key} index={index} onRemove={() => remove(index)} />
        ))}
      </View>
      <ListFindings />
      {fields.length < MOST_SOURCES ? (
        <Button label={words.worksheet.addSource} icon="plus" onPress={addSource} />
      ) : (
        <Text variant="label">{words.worksheet.mostSources(MOST_SOURCES)}</Text>
      )}
      <Text variant="cite" color="ink2" style={styles.foot}>
        {words.worksheet.switchNeverOpen}
      </Text>
    </SectionFrame>
  );
}

const styles = StyleSheet.create({ foot: { marginTop: -space.xs } });
