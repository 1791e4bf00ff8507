import { useMemo, useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { assess, pathOf, type Finding } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';
import { isoInZone } from '@/shared/siteTime';
import type { CloseOut } from '@/shared/worksheet';
import { isProblem } from '../api/ApiProblem';
import type { KeptForm } from '../drafts/useKeptForm';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import {
  Button,
  Citation,
  Notice,
  NumberField,
  PinField,
  Section,
  Text,
  TextField,
  YesNo,
  describeFault,
} from '../ui';
import { findingsOf, usePinFault } from '../signing/SigningProblem';
import { hintOf, labelOf } from '../worksheet/form/fieldWords';
import { FindingPanels } from '../worksheet/parts/FindingPanels';
import { FoldedPoints } from '../worksheet/parts/PointsList';
import { SectionPhotos } from '../worksheet/parts/SectionPhotos';
import { useNow } from '../worksheet/useAssessment';
import { useWorksheetAct } from '../worksheet/worksheetQueries';

type Flag = Exclude<keyof CloseOut, 'notes' | 'egressTestedSeconds'>;

const PIN_LENGTH = 6;

interface Props {
  record: WorksheetRecord;
  kept: KeptForm<CloseOut>;
}

/** What is asked of this worksheet, in the order in which a circuit is made live again. */
function questionsOf(record: WorksheetRecord, closeOut: CloseOut): Flag[] {
  const { content } = record;
  const off = pathOf(content) === 'off';
  const tripped = content.supply?.tripped !== undefined && content.supply.tripped !== 'no';
  const locks = off && closeOut.restored !== false;
  return [
    'toolsClear',
    'coversOn',
    'peopleWarned',
    ...(locks ? (['locksRemoved'] as const) : []),
    'peopleClear',
    ...(tripped ? (['faultRepaired'] as const) : []),
    ...(off ? (['restored'] as const) : []),
  ];
}

function without(closeOut: CloseOut, key: keyof CloseOut): CloseOut {
  return Object.fromEntries(Object.entries(closeOut).filter(([each]) => each !== key));
}

function useCloseOutAssessment({ content, timeZone, proofs }: WorksheetRecord, closeOut: CloseOut) {
  const now = useNow();
  return useMemo(
    () =>
      assess(content, {
        on: isoInZone(now, timeZone),
        stage: 'close-out',
        proof: proofs.at(-1)?.proof,
        closeOut,
      }),
    [content, timeZone, proofs, closeOut, now],
  );
}

/** One question with what the rules say of its answer. */
function Question({
  name,
  findings,
  note,
  children,
}: {
  name: keyof CloseOut;
  findings: readonly Finding[];
  note?: string;
  children: ReactNode;
}) {
  const own = findings.filter(({ path }) => path === `/closeOut/${name}`);
  const cited = own[0]?.citation;
  const answered = own.filter(
    ({ severity, params }) => severity !== 'open' || params['field'] === undefined,
  );
  return (
    <View style={styles.question}>
      {children}
      {note !== undefined && <Text color="ink2">{note}</Text>}
      {answered.length > 0 ? (
        <FindingPanels findings={answered} />
      ) : (
        cited !== undefined && <Citation citation={cited} />
      )}
    </View>
  );
}

/** Emergency lighting, once the circuit is restored: asked where the rules ask it. */
function Egress({ kept, findings }: { kept: KeptForm<CloseOut>; findings: readonly Finding[] }) {
  const words = useMessages();
  const { value: closeOut, change } = kept;
  const asks = (name: keyof CloseOut) =>
    closeOut[name] !== undefined || findings.some(({ path }) => path === `/closeOut/${name}`);
  return (
    <>
      {asks('egressTestedSeconds') && (
        <Question name="egressTestedSeconds" findings={findings}>
          <NumberField
            id="close-egressTestedSeconds"
            label={labelOf(words, 'closeOut.egressTestedSeconds')}
            hint={hintOf(words, 'closeOut.egressTestedSeconds')}
            unit={words.closeOut.seconds}
            min={0}
            value={closeOut.egressTestedSeconds}
            onChange={(seconds) =>
              change((before) =>
                seconds === undefined
                  ? without(before, 'egressTestedSeconds')
                  : { ...before, egressTestedSeconds: seconds },
              )
            }
          />
        </Question>
      )}
      {asks('egressLit') && (
        <Question name="egressLit" findings={findings}>
          <YesNo
            id="close-egressLit"
            label={labelOf(words, 'closeOut.egressLit')}
            value={closeOut.egressLit}
            onChange={(egressLit) => change((before) => ({ ...before, egressLit }))}
          />
        </Question>
      )}
    </>
  );
}

function Notes({ kept }: { kept: KeptForm<CloseOut> }) {
  const words = useMessages();
  return (
    <TextField
      id="close-notes"
      label={labelOf(words, 'closeOut.notes')}
      hint={words.closeOut.notesHint}
      multiline
      maxLength={2000}
      value={kept.value.notes ?? ''}
      onChangeText={(notes) =>
        kept.change((before) => (notes === '' ? without(before, 'notes') : { ...before, notes }))
      }
    />
  );
}

function Close({ record, kept, left }: Props & { left: readonly Finding[] }) {
  const words = useMessages();
  const said = words.closeOut;
  const [pin, setPin] = useState('');
  const close = useWorksheetAct(record.id, 'close');
  const pinFault = usePinFault(close.error);
  const { error } = close;
  const reason =
    left.length > 0
      ? said.open(left.length)
      : pin.length < PIN_LENGTH
        ? said.missingPin
        : undefined;
  return (
    <Section id="close-record" title={said.record} state={left.length > 0 ? 'waits' : 'open'}>
      <View style={styles.questions}>
        <Text color="ink2">{said.recordNote}</Text>
        <FoldedPoints findings={left} />
        <PinField
          id="close-pin"
          value={pin}
          onChange={(next) => {
            setPin(next);
            if (pinFault !== undefined) close.reset();
          }}
          error={pinFault}
        />
        {isProblem(error, 'not-ready') && (
          <>
            <Notice live title={said.notReadyTitle}>
              {words.problems['not-ready'].remedy}
            </Notice>
            <FindingPanels findings={findingsOf(error)} />
          </>
        )}
        {error !== null && pinFault === undefined && !isProblem(error, 'not-ready') && (
          <Notice live>
            {isProblem(error, 'wrong-state') ? said.moved : describeFault(error, words)}
          </Notice>
        )}
        <Button
          kind="primary"
          large
          icon={reason === undefined ? 'seal' : undefined}
          label={said.button}
          reason={reason}
          busy={close.isPending}
          onPress={() =>
            void close
              .mutateAsync({ closeOut: kept.value, pin })
              .then(() => kept.clear())
              // What went wrong is shown from the mutation's own state.
              .catch(() => undefined)
          }
        />
      </View>
    </Section>
  );
}

/** The questions of the close-out with what the rules say now, then the PIN. */
export function CloseOutForm({ record, kept }: Props) {
  const words = useMessages();
  const said = words.closeOut;
  const { value: closeOut, change } = kept;
  const assessment = useCloseOutAssessment(record, closeOut);
  const { findings } = assessment;
  const left = findings.filter(({ severity }) => severity !== 'caution');
  const off = pathOf(record.content) === 'off';
  const questions = questionsOf(record, closeOut);
  const locks = [
    ...new Set((record.content.sources ?? []).flatMap(({ lockNumber }) => lockNumber ?? [])),
  ];
  const elsewhere = findings.filter(({ path }) => !path.startsWith('/closeOut/'));
  return (
    <View>
      <Section
        id="close-steps"
        title={words.common.sections.closeOut}
        state={
          left.some(({ severity }) => severity === 'stop')
            ? 'stop'
            : left.length > 0
              ? 'open'
              : 'complete'
        }
        detail={left.length > 0 ? words.common.counts.openPoints(left.length) : undefined}
      >
        <View style={styles.questions}>
          <Text>{off ? said.lead : said.leadEnergized}</Text>
          {questions.map((name) => (
            <Question
              key={name}
              name={name}
              findings={findings}
              note={
                name === 'locksRemoved' && locks.length > 0
                  ? said.locks(locks.join(', '))
                  : name === 'restored' && closeOut.restored === false
                    ? said.staysLocked
                    : undefined
              }
            >
              <YesNo
                id={`close-${name}`}
                label={labelOf(words, `closeOut.${name}`)}
                hint={hintOf(words, `closeOut.${name}`)}
                strongLabel
                value={closeOut[name]}
                onChange={(value) =>
                  change((before) => {
                    const next = { ...before, [name]: value };
                    return name === 'restored' && !value ? without(next, 'locksRemoved') : next;
                  })
                }
              />
            </Question>
          ))}
          <Egress kept={kept} findings={findings} />
          <FindingPanels findings={elsewhere} />
          <Notes kept={kept} />
          <SectionPhotos record={record} section="closeOut" />
        </View>
      </Section>
      <Close record={record} kept={kept} left={left} />
    </View>
  );
}

const styles = StyleSheet.create({
  questions: { gap: space.lg },
  question: { gap: space.xs },
});
