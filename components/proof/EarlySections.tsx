import { StyleSheet, View } from 'react-native';
import { OTHER_LIVE_PARTS, STORED_ENERGY } from '@/hazard';
import { timeText, volts } from '@/shared/format';
import { citation } from '@/hazard';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, CheckRow, Choice, Citation, Text, TextField, parseNumber } from '../ui';
import { wordOf } from '../worksheet/form/fieldWords';
import { controlPosition, controlsOf, type Control, type Position } from './controls';
import { PressHalves } from './PressHalves';
import type { ProofState } from './useProof';

interface Props {
  state: ProofState;
}

/** Takes a mark out again, or sets it with the time at which it was made. */
function toggled(marks: Readonly<Record<string, string>>, key: string, at: string) {
  if (!(key in marks)) return { ...marks, [key]: at };
  return Object.fromEntries(Object.entries(marks).filter(([each]) => each !== key));
}

/** 1. Each way opened, held as planned, and tried. */
export function Ways({ state }: Props) {
  const words = useMessages();
  const said = words.proof.ways;
  const { record, form, change, stamp } = state;
  return (
    <>
      <Text color="ink2">{said.note}</Text>
      <View>
        {(record.content.sources ?? []).map((source, index) => {
          const kind =
            source.kind === undefined
              ? words.worksheet.newSource
              : wordOf(words, 'sourceKind', source.kind);
          const device =
            source.openedAt === undefined
              ? words.ui.notAnswered
              : wordOf(words, 'openedAt', source.openedAt);
          const held =
            source.lockNumber === undefined ? device : said.opened(device, source.lockNumber);
          const where = source.from === undefined ? held : `${source.from}. ${held}`;
          const at = source.id === undefined ? undefined : form.tried[source.id];
          return (
            <CheckRow
              key={source.id ?? index}
              label={said.name(`3.${index + 1}`, kind)}
              note={at === undefined ? where : said.tried(where, timeText(at, record.timeZone))}
              reason={source.id === undefined ? said.noId : undefined}
              checked={at !== undefined}
              unanswered={at === undefined}
              onChange={() =>
                change((before) => ({
                  ...before,
                  tried: toggled(before.tried, source.id ?? '', stamp()),
                }))
              }
            />
          );
        })}
      </View>
      <Citation
        citation={[citation('osha1910.333(b)(2)(ii)'), citation('osha1910.333(b)(2)(iv)(A)')]}
      />
    </>
  );
}

function useControlName() {
  const said = useMessages().proof.controls;
  return ({ kind, name, number }: Control): string => {
    if (kind === 'automatic') return said.automatic;
    if (kind === 'none') return said.breakerOnly;
    if (name !== undefined) return said.named(name);
    return number === undefined ? said.oneSwitch : said.numberedSwitch(number);
  };
}

/** 2. Every control put on, in each of its positions. */
export function Controls({ state }: Props) {
  const said = useMessages().proof.controls;
  const nameOf = useControlName();
  const { record, form, change, stamp } = state;
  const controls = controlsOf(record.content, form.moreSwitches);
  const hasSwitch = controls.some(({ kind }) => kind === 'switch');
  return (
    <>
      <Text color="ink2">{said.note}</Text>
      {controls.map((control) => {
        const times = control.positions.map(
          (position) => form.controls[controlPosition(control, position)],
        );
        const last = times.every((time) => time !== undefined) ? times.at(-1) : undefined;
        return (
          <PressHalves
            key={control.key}
            label={nameOf(control)}
            note={last === undefined ? undefined : said.done(timeText(last, record.timeZone))}
            halves={control.positions.map((position: Position) => ({
              key: controlPosition(control, position),
              label: said[position],
              done: controlPosition(control, position) in form.controls,
            }))}
            onPress={(key) =>
              change((before) => ({ ...before, controls: toggled(before.controls, key, stamp()) }))
            }
          />
        );
      })}
      {hasSwitch && (
        <View style={styles.row}>
          <Button
            kind="quiet"
            icon="plus"
            label={said.add}
            onPress={() =>
              change((before) => ({ ...before, moreSwitches: before.moreSwitches + 1 }))
            }
          />
          {form.moreSwitches > 0 && (
            <Button
              kind="quiet"
              icon="close"
              label={said.remove}
              onPress={() =>
                change((before) => ({ ...before, moreSwitches: before.moreSwitches - 1 }))
              }
            />
          )}
        </View>
      )}
      <Citation citation={[citation('osha1910.333(b)(2)(iv)(A)'), citation('face04WA080')]} />
    </>
  );
}

/** 3. and 8. The tester proved on a known live source, before and after. */
export function TesterProved({ state, when }: Props & { when: 'before' | 'after' }) {
  const words = useMessages();
  const locale = useLocale();
  const said = words.proof;
  const { record, form, change, stamp } = state;
  const field = when === 'before' ? 'provedBeforeAt' : 'provedAfterAt';
  const at = form[field];
  const { instrument, category, ratedVolts } = record.content.absenceTest ?? {};
  const planned = [
    instrument && wordOf(words, 'instrument', instrument),
    category && wordOf(words, 'category', category),
    ratedVolts === undefined ? undefined : volts(locale, ratedVolts),
  ].filter(Boolean);
  return (
    <>
      <Text color="ink2">{said[when].note}</Text>
      {when === 'before' && planned.length > 0 && (
        <Text variant="answer">{said.before.instrument(planned.join(', '))}</Text>
      )}
      <CheckRow
        label={said[when].check}
        note={at === undefined ? undefined : said.before.at(timeText(at, record.timeZone))}
        checked={at !== undefined}
        unanswered={at === undefined}
        onChange={(checked) =>
          change((before) => ({ ...before, [field]: checked ? stamp() : undefined }))
        }
      />
      <Citation citation={citation('nfpa70e.absenceTest')} />
    </>
  );
}

/** 5. The clamp on the neutral, before it is parted. */
export function Clamp({ state }: Props) {
  const words = useMessages();
  const said = words.proof.clamp;
  const { form, change, asked } = state;
  const unreadable = parseNumber(form.neutral).kind === 'text';
  return (
    <>
      <TextField
        id="proof-neutral"
        label={said.label}
        hint={said.hint}
        unit="A"
        exact
        inputMode="decimal"
        value={form.neutral}
        error={unreadable ? words.ui.notANumber(form.neutral.trim()) : undefined}
        onChangeText={(neutral) => change((before) => ({ ...before, neutral }))}
      />
      <Text color="ink2">{asked.has('clamp') ? said.note : said.notAsked}</Text>
      <Citation citation={[citation('practice.neutral'), citation('nec300.13(B)')]} />
    </>
  );
}

/** 6. What else is live in the same box. */
export function Others({ state }: Props) {
  const words = useMessages();
  const { form, change } = state;
  return (
    <>
      <Choice
        id="proof-others"
        label={words.proof.others.label}
        options={OTHER_LIVE_PARTS.map((value) => ({
          value,
          label: words.enumerations.otherLiveParts[value],
          refused: value === 'not guarded',
        }))}
        value={form.otherLiveParts}
        onChange={(otherLiveParts) => change((before) => ({ ...before, otherLiveParts }))}
      />
      <Citation citation={[citation('osha1910.333(a)(1)'), citation('osha1910.335(a)(2)(ii)')]} />
    </>
  );
}

/** 7. What holds energy behind an open breaker. */
export function Stored({ state }: Props) {
  const words = useMessages();
  const { form, change, asked } = state;
  return (
    <>
      {!asked.has('stored') && <Text color="ink2">{words.proof.stored.notAsked}</Text>}
      <Choice
        id="proof-stored"
        label={words.proof.stored.label}
        options={STORED_ENERGY.map((value) => ({
          value,
          label: words.enumerations.storedEnergy[value],
          refused: value === 'not discharged',
        }))}
        value={form.storedEnergy}
        onChange={(storedEnergy) => change((before) => ({ ...before, storedEnergy }))}
      />
      <Citation citation={citation('osha1910.333(b)(2)(ii)(C)')} />
    </>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.lg },
});
