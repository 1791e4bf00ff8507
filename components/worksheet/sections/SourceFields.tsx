import { useFormContext } from 'react-hook-form';
import { EXTRA_MEASURES, HELD, OPENED_AT, SOURCE_KINDS, SYSTEMS } from '@/hazard';
import { useMessages } from '../../i18n/useMessages';
import { Button } from '../../ui';
import { FieldSelect, FieldText, FieldYesNo } from '../form/fields';
import { FieldCrew, FieldCrewList } from '../form/crewFields';
import { FieldWordList } from '../form/FieldWordList';
import { wordOf } from '../form/fieldWords';
import { useWorksheetForm } from '../form/WorksheetFormContext';

const OWN_SYSTEM = new Set(['generator', 'central inverter', 'backfeed', 'control']);
const STANDBY = new Set(['generator', 'central inverter']);

/** Takes over how another way is opened and held, where one device opens both. */
function SameLock({ index }: { index: number }) {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const { setValue } = useFormContext();
  const own = content.sources?.[index];
  const first = content.sources?.findIndex(
    (source, at) => at !== index && source.openedAt !== undefined && source.held !== undefined,
  );
  if (own?.kind === undefined || own.kind === 'battery unit' || own.openedAt !== undefined)
    return null;
  const other = first === undefined ? undefined : content.sources?.[first];
  if (first === undefined || other === undefined || other.kind === 'battery unit') return null;
  const take = () => {
    for (const field of ['openedAt', 'held', 'lockNumber', 'lockedBy', 'byCrewId'] as const) {
      setValue(`sources.${index}.${field}`, other[field], { shouldDirty: true });
    }
  };
  return <Button label={words.worksheet.sameLockAs(`3.${first + 1}`)} icon="lock" onPress={take} />;
}

/** Everything asked of one way it can be live. */
export function SourceFields({ index }: { index: number }) {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const sources = content.sources ?? [];
  const source = sources[index] ?? {};
  const at = (field: string) => `sources.${index}.${field}`;
  const others = sources.filter(
    (other, place) =>
      place !== index && other.id !== undefined && other.sameConductorsAs === undefined,
  );
  const standbyListed = sources.some(({ kind }) => STANDBY.has(kind ?? ''));
  const nameOf = (id: string) => {
    const place = sources.findIndex((other) => other.id === id);
    const kind = sources[place]?.kind;
    return `3.${place + 1} ${kind === undefined ? '' : wordOf(words, 'sourceKind', kind)}`;
  };
  const locked = source.held === 'lock and tag' || source.held === 'lock';
  return (
    <>
      <FieldSelect name={at('kind')} values={SOURCE_KINDS} group="sourceKind" />
      <FieldText name={at('from')} />
      {source.kind !== 'normal' && others.length > 0 && (
        <FieldSelect
          name={at('sameConductorsAs')}
          values={others.map(({ id }) => id ?? '')}
          wordFor={nameOf}
        />
      )}
      {OWN_SYSTEM.has(source.kind ?? '') && source.sameConductorsAs === undefined && (
        <FieldSelect name={at('system')} values={SYSTEMS} group="system" />
      )}
      {(content.job?.pointsOfWork ?? 1) > 1 &&
        source.sameConductorsAs === undefined &&
        source.kind !== 'normal' && <FieldWordList name={at('points')} />}
      <SameLock index={index} />
      <FieldSelect name={at('openedAt')} values={OPENED_AT} group="openedAt" />
      <FieldSelect name={at('held')} values={HELD} group="held" />
      {source.held === 'tag' && (
        <FieldSelect name={at('extraMeasure')} values={EXTRA_MEASURES} group="extraMeasure" />
      )}
      {locked && <FieldText name={at('lockNumber')} exact />}
      <FieldCrew name={at('byCrewId')} />
      {source.held !== 'exclusive control' && <FieldCrewList name={at('lockedBy')} />}
      {source.kind === 'shared neutral' && <FieldYesNo name={at('allPhasesOpened')} />}
      {standbyListed && (source.kind === 'normal' || STANDBY.has(source.kind ?? '')) && (
        <FieldYesNo name={at('upstreamOfTransfer')} />
      )}
    </>
  );
}
