import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { citation } from '@/hazard';
import { reading as readingText, timeText } from '@/shared/format';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, Choice, Citation, Notice, Text, TextField } from '../ui';
import { lowerFirst } from '../signing/lowerFirst';
import { FindingPanels } from '../worksheet/parts/FindingPanels';
import { wordOf } from '../worksheet/form/fieldWords';
import { cellWords, conductorName, toConductor } from './cellWords';
import type { SourceToRead } from './plan';
import { PointTabs } from './PointTabs';
import {
  MOST_READINGS,
  STRAY_ABOVE_VOLTS,
  cellKey,
  cellsAt,
  hasUnreadable,
  pointNames,
  takenAt,
  voltsOf,
  type Cell,
  type Entry,
} from './proofForm';
import { ReadingCell } from './ReadingCell';
import { ReadingTable } from './ReadingTable';
import type { ProofState } from './useProof';

interface Props {
  state: ProofState;
  place: number;
  onPlace: (place: number) => void;
}

const PANEL = 'proof-point';

interface MatrixProps {
  state: ProofState;
  place: number;
  name: string;
  lowImpedance: boolean;
}

/** One cell of the matrix, bound to what the form holds of it. */
function BoundCell({ of: cell, state, name, lowImpedance }: MatrixProps & { of: Cell }) {
  const said = useMessages().proof.readings;
  const { form, plan, change, stamp } = state;
  const key = cellKey(cell);
  return (
    <ReadingCell
      id={`cell-${key.replace(/[^\w-]+/g, '-')}`}
      label={cellWords(cell, name, plan, said)}
      entries={form.readings[key] ?? []}
      lowImpedance={lowImpedance}
      stamp={stamp}
      onChange={(entries) =>
        change((before) => ({ ...before, readings: { ...before.readings, [key]: entries } }))
      }
    />
  );
}

/** The circuit's own conductors, each to each. */
function CircuitMatrix(props: MatrixProps) {
  const { state, place, name } = props;
  const said = useMessages().proof.readings;
  const cell = (of: Cell) => <BoundCell key={cellKey(of)} of={of} {...props} />;
  const { plan } = state;
  const rows = plan.conductors.slice(0, -1);
  const columns = plan.conductors.slice(1);
  const title = said.circuit(name);
  return (
    <View style={styles.matrix}>
      <Text variant="strong">{title}</Text>
      <ReadingTable
        label={title}
        columns={columns.map((to) => toConductor(to, plan, said))}
        rows={rows.map((from, row) => ({
          label: conductorName(from, plan, said),
          cells: columns.map((to, column) =>
            column < row ? null : cell({ point: place, from, to, current: 'ac' }),
          ),
        }))}
      />
    </View>
  );
}

/** A source with conductors of its own, or a battery: AC to each phase and to ground, DC plus to minus. */
function SourceMatrix({ item, ...props }: MatrixProps & { item: SourceToRead }) {
  const { state, place, name } = props;
  const words = useMessages();
  const said = words.proof.readings;
  const cell = (of: Cell) => <BoundCell key={cellKey(of)} of={of} {...props} />;
  const { plan } = state;
  const { source, ac, dc } = item;
  const kind = source.kind === null ? '' : lowerFirst(wordOf(words, 'sourceKind', source.kind));
  const title = said.source(name, `3.${source.index + 1}`, kind);
  const to = ac ? [...plan.phases, 'G' as const] : [];
  const of = { point: place, sourceId: source.id };
  return (
    <View style={styles.matrix}>
      <Text variant="strong">{title}</Text>
      <ReadingTable
        label={title}
        columns={[
          ...to.map((each) => toConductor(each, plan, said)),
          ...(dc ? [said.plusMinus] : []),
        ]}
        rows={[
          ...(ac
            ? [
                {
                  label: said.ac,
                  cells: [
                    ...to.map((each) => cell({ ...of, to: each, current: 'ac' })),
                    ...(dc ? [null] : []),
                  ],
                },
              ]
            : []),
          ...(dc
            ? [{ label: said.dc, cells: [...to.map(() => null), cell({ ...of, current: 'dc' })] }]
            : []),
        ]}
      />
      {dc && <Text color="ink2">{said.dcNote}</Text>}
    </View>
  );
}

interface Kept {
  key: string;
  index: number;
  words: string;
  entry: Entry;
}

/** Readings above 3 V stay on record beside the ones that settled them. */
function KeptReadings({ state, names }: { state: ProofState; names: readonly string[] }) {
  const said = useMessages().proof.readings;
  const locale = useLocale();
  const { form, plan, change, record } = state;
  const kept = names.flatMap((name, place) =>
    cellsAt(place, name, plan).flatMap((cell) => {
      const key = cellKey(cell);
      return (form.readings[key] ?? []).flatMap((entry, index): Kept[] =>
        entry.kept && Math.abs(voltsOf(entry) ?? 0) > STRAY_ABOVE_VOLTS
          ? [{ key, index, words: cellWords(cell, name, plan, said), entry }]
          : [],
      );
    }),
  );
  if (kept.length === 0) return null;
  return (
    <View style={styles.matrix}>
      <Text variant="strong">{said.keptTitle}</Text>
      {kept.map(({ key, index, words, entry }) => (
        <View key={`${key} ${index}`}>
          <Text>
            {said.keptLine(
              words,
              readingText(locale, voltsOf(entry) ?? 0),
              lowerFirst(entry.lowImpedance ? said.low : said.normal),
              timeText(entry.at, record.timeZone),
            )}
          </Text>
          <Button
            kind="quiet"
            icon="close"
            label={said.mistyped}
            aria-label={`${said.mistyped}: ${words}`}
            onPress={() =>
              change((before) => ({
                ...before,
                readings: {
                  ...before.readings,
                  [key]: (before.readings[key] ?? []).filter((_, at) => at !== index),
                },
              }))
            }
          />
        </View>
      ))}
    </View>
  );
}

/** The points that no source names are named by the lead; a name belongs to one point. */
function PointNames({ state, names }: { state: ProofState; names: readonly string[] }) {
  const said = useMessages().proof.readings;
  const [open, setOpen] = useState(false);
  const { plan, form, change } = state;
  const free = names.map((_, place) => place).filter((place) => place >= plan.fixedPoints.length);
  if (free.length === 0) return null;
  return (
    <View style={styles.names}>
      <Button
        kind="quiet"
        icon="pen"
        iconEnd={open ? 'up' : 'down'}
        label={said.namePoints}
        aria-expanded={open}
        onPress={() => setOpen(!open)}
      />
      {open &&
        free.map((place) => (
          <TextField
            key={place}
            id={`proof-point-${place}`}
            label={said.pointName(place + 1)}
            exact
            maxLength={40}
            value={form.points[String(place)] ?? ''}
            error={
              names.filter((name) => name === names[place]).length > 1 ? said.sameName : undefined
            }
            onChangeText={(name) =>
              change((before) => ({
                ...before,
                points: { ...before.points, [String(place)]: name },
              }))
            }
          />
        ))}
    </View>
  );
}

/** 4. Every conductor to every other, at every point of work. */
export function Readings({ state, place, onPlace }: Props) {
  const said = useMessages().proof.readings;
  const [lowImpedance, setLowImpedance] = useState(false);
  const { plan, form, proof, findingsOf } = state;
  const names = pointNames(form, plan);
  const shown = Math.min(place, names.length - 1);
  const name = names[shown] ?? '1';
  const matrix = { state, place: shown, name, lowImpedance };
  return (
    <>
      {plan.pointsOfWork === null && <Notice>{said.noPoints}</Notice>}
      <View style={styles.points}>
        <Text variant="label" color="ink2">
          {said.points}
        </Text>
        <PointTabs
          points={names.map((each, at) => {
            const cells = cellsAt(at, each, plan);
            return { name: each, taken: takenAt(cells, form), all: cells.length };
          })}
          chosen={shown}
          onChoose={onPlace}
          panelId={PANEL}
        />
        <PointNames state={state} names={names} />
      </View>
      <View id={PANEL} role="tabpanel" aria-label={name} style={styles.panel}>
        <CircuitMatrix {...matrix} />
        {plan.sourcesAt(name).map((item) => (
          <SourceMatrix key={item.source.index} {...matrix} item={item} />
        ))}
        <FindingPanels
          findings={findingsOf('readings').filter(({ severity }) => severity === 'stop')}
        />
      </View>
      {hasUnreadable(form) && <Notice live>{said.notANumber}</Notice>}
      {(proof.readings?.length ?? 0) > MOST_READINGS && (
        <Notice live>{said.tooMany(MOST_READINGS)}</Notice>
      )}
      <Choice
        id="proof-meter"
        label={said.meter}
        layout="row"
        options={[
          { value: false, label: said.normal },
          { value: true, label: said.low },
        ]}
        value={lowImpedance}
        onChange={setLowImpedance}
      />
      <Text>{said.strayNote}</Text>
      <KeptReadings state={state} names={names} />
      <Citation
        citation={[citation('osha1910.333(b)(2)(iv)(B)'), citation('nfpa70e.absenceTest')]}
      />
    </>
  );
}

const styles = StyleSheet.create({
  points: { gap: space.xs },
  names: { gap: space.sm },
  panel: { gap: space.lg },
  matrix: { gap: space.xs },
});
