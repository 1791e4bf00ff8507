import { router } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { timeText } from '@/shared/format';
import type { WorksheetRecord } from '@/shared/record';
import { useUser } from '../api/session';
import { useKeptForm, type KeptForm } from '../drafts/useKeptForm';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import {
  LoadingScreen,
  Notice,
  SavedState,
  Screen,
  TitleBlock,
  VerdictBar,
  focusField,
  type MarkState,
} from '../ui';
import { placeText, taskText } from '../signing/SigningFacts';
import { NotProvedPanel } from '../worksheet/parts/NotProvedPanel';
import { controlPosition, controlsOf } from './controls';
import { Clamp, Controls, Others, Stored, TesterProved, Ways } from './EarlySections';
import {
  cellsAt,
  emptyProofForm,
  pointNames,
  proofFormSchema,
  takenAt,
  type ProofForm,
} from './proofForm';
import { ProofSectionFrame, proofAnchor } from './ProofSectionFrame';
import { ProofStrip } from './ProofStrip';
import { Readings } from './Readings';
import { Record } from './Record';
import { PROOF_SECTIONS, useProof, type ProofSection, type ProofState } from './useProof';

/** Long enough for an unfolded section to be drawn. */
const DRAWN_MS = 80;

interface Count {
  done: number;
  all: number;
}

/** How many ways, control positions and readings are done. */
function countsOf({
  record,
  form,
  plan,
}: ProofState): Record<'ways' | 'controls' | 'readings', Count> {
  const sources = record.content.sources ?? [];
  const positions = controlsOf(record.content, form.moreSwitches).flatMap((control) =>
    control.positions.map((position) => controlPosition(control, position)),
  );
  const cells = pointNames(form, plan).map((name, place) => cellsAt(place, name, plan));
  return {
    ways: {
      done: sources.filter(({ id }) => id !== undefined && id in form.tried).length,
      all: sources.length,
    },
    controls: {
      done: positions.filter((key) => key in form.controls).length,
      all: positions.length,
    },
    readings: {
      done: cells.reduce((sum, each) => sum + takenAt(each, form), 0),
      all: cells.reduce((sum, each) => sum + each.length, 0),
    },
  };
}

/** The first part that still lacks something; at the readings also which point does. */
function nextOf(state: ProofState): { section: ProofSection; place?: number; name?: string } {
  const section = PROOF_SECTIONS.find((each) => state.findingsOf(each).length > 0) ?? 'record';
  if (section !== 'readings') return { section };
  const names = pointNames(state.form, state.plan);
  const place = names.findIndex((name, at) => {
    const cells = cellsAt(at, name, state.plan);
    return takenAt(cells, state.form) < cells.length;
  });
  return place < 0 ? { section } : { section, place, name: names[place] };
}

function Bar({
  state,
  onGo,
}: {
  state: ProofState;
  onGo: (section: ProofSection, place?: number) => void;
}) {
  const words = useMessages();
  const said = words.proof.bar;
  const { left, hasVoltage, record } = state;
  const next = hasVoltage ? { section: 'record' as const } : nextOf(state);
  const label =
    next.section === 'record'
      ? said.toRecord
      : words.common.buttons.goTo(
          'name' in next && next.name !== undefined
            ? next.name
            : String(PROOF_SECTIONS.indexOf(next.section) + 1),
        );
  return (
    <VerdictBar
      tone={hasVoltage ? 'stop' : 'ink'}
      mark={hasVoltage ? 'stop' : undefined}
      word={hasVoltage ? undefined : said.live}
      detail={hasVoltage ? said.stopDetail : said.detail(left.length)}
      stop={{
        label: words.common.buttons.stop,
        onPress: () =>
          router.push({
            pathname: '/worksheets/[worksheetId]/stop',
            params: { worksheetId: record.id },
          }),
      }}
      action={{
        label,
        onPress: () => onGo(next.section, 'place' in next ? next.place : undefined),
      }}
    />
  );
}

function Head({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const ends = record.content.job?.endsAt;
  return (
    <View style={styles.head}>
      <TitleBlock
        cells={[
          {
            label: words.common.worksheet,
            value: words.common.numbered(record.number, record.revision),
          },
          {
            label: words.proof.inForce,
            value: ends === undefined ? '' : words.proof.until(timeText(ends, record.timeZone)),
          },
        ]}
      />
      {/* A new proof is asked: until it is recorded, what was proved before no longer counts here. */}
      <NotProvedPanel record={{ ...record, proved: false }} />
    </View>
  );
}

interface FormProps {
  record: WorksheetRecord;
  kept: KeptForm<ProofForm>;
  onProved: () => void;
}

function Form({ record, kept, onProved }: FormProps) {
  const words = useMessages();
  const said = words.proof;
  const state = useProof(record, kept);
  const [folded, setFolded] = useState<Partial<Record<ProofSection, boolean>>>({});
  const [place, setPlace] = useState(0);
  const [unproved, setUnproved] = useState<string>();
  const counts = countsOf(state);
  const ofRecord = state.findingsOf('record').length;
  const before = state.left.length - state.findingsOf('after').length - ofRecord;
  const readingsLeft = counts.readings.all - counts.readings.done;

  function go(section: ProofSection, at?: number) {
    setFolded((was) => ({ ...was, [section]: false }));
    if (at !== undefined) setPlace(at);
    setTimeout(() => focusField(proofAnchor(section)), DRAWN_MS);
  }
  const frame = (section: ProofSection, title: string) => ({
    state,
    section,
    title,
    open: folded[section] !== true,
    onToggle: (each: ProofSection) => setFolded((was) => ({ ...was, [each]: was[each] !== true })),
  });
  const of = ({ done, all }: Count) => words.common.counts.of(done, all);
  const waits: MarkState = 'waits';
  // An empty field that nothing asks for is not done; it is not asked.
  const unasked = (section: ProofSection, empty: boolean) =>
    empty && !state.asked.has(section) ? { mark: waits, word: said.stored.short } : {};
  return (
    <Screen
      title={said.title}
      subtitle={`${taskText(record, words)} ${placeText(record, words)}`}
      back={{
        label: said.back,
        href: { pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } },
      }}
      saved={
        kept.keptAt === null ? undefined : (
          <SavedState>{said.kept(timeText(kept.keptAt, record.timeZone))}</SavedState>
        )
      }
      head={<Head record={record} />}
      bar={<Bar state={state} onGo={go} />}
    >
      <ProofStrip record={record} />
      {unproved !== undefined && (
        <Notice live icon="sent">
          {said.recordedNotProved(timeText(unproved, record.timeZone))}
        </Notice>
      )}
      <View style={styles.sections}>
        <ProofSectionFrame {...frame('ways', said.ways.title)} detail={of(counts.ways)}>
          <Ways state={state} />
        </ProofSectionFrame>
        <ProofSectionFrame {...frame('controls', said.controls.title)} detail={of(counts.controls)}>
          <Controls state={state} />
        </ProofSectionFrame>
        <ProofSectionFrame {...frame('before', said.before.title)}>
          <TesterProved state={state} when="before" />
        </ProofSectionFrame>
        <ProofSectionFrame {...frame('readings', said.readings.title)} detail={of(counts.readings)}>
          <Readings state={state} place={place} onPlace={setPlace} />
        </ProofSectionFrame>
        <ProofSectionFrame
          {...frame('clamp', said.clamp.title)}
          {...unasked('clamp', state.form.neutral === '')}
        >
          <Clamp state={state} />
        </ProofSectionFrame>
        <ProofSectionFrame {...frame('others', said.others.title)}>
          <Others state={state} />
        </ProofSectionFrame>
        <ProofSectionFrame
          {...frame('stored', said.stored.title)}
          {...unasked('stored', state.form.storedEnergy === undefined)}
        >
          <Stored state={state} />
        </ProofSectionFrame>
        <ProofSectionFrame
          {...frame('after', said.after.title)}
          mark={readingsLeft > 0 ? waits : undefined}
          word={readingsLeft > 0 ? said.after.waits(readingsLeft) : undefined}
        >
          <TesterProved state={state} when="after" />
        </ProofSectionFrame>
        <ProofSectionFrame
          {...frame('record', said.record.title)}
          mark={before > 0 ? waits : 'open'}
          word={before > 0 ? said.record.waits(before) : undefined}
        >
          <Record
            state={state}
            onRecorded={({ at, proved }) => {
              void kept.clear();
              if (proved) onProved();
              else setUnproved(at);
            }}
          />
        </ProofSectionFrame>
      </View>
    </Screen>
  );
}

/** The test for absence of voltage. What is entered is kept on the device until it is recorded. */
export function ProofFormScreen({
  record,
  onProved,
}: {
  record: WorksheetRecord;
  onProved: () => void;
}) {
  const words = useMessages().proof;
  const user = useUser();
  const kept = useKeptForm({
    userId: user.id,
    key: `proof/${record.id}/${record.revision}`,
    schema: proofFormSchema,
    initial: emptyProofForm,
  });
  if (kept === undefined) return <LoadingScreen label={words.loading} />;
  return <Form record={record} kept={kept} onProved={onProved} />;
}

const styles = StyleSheet.create({
  head: { gap: space.md, paddingBottom: space.md },
  sections: { paddingTop: space.md },
});
