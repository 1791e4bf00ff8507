import { JOB_TASKS, LAMPS, SPECIAL_CONDITIONS, pathOf } from '@/hazard';
import { windowText } from '@/shared/format';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { Notice, Text } from '../../ui';
import {
  FieldDateTime,
  FieldMulti,
  FieldNumber,
  FieldSelect,
  FieldText,
  FieldYesNo,
} from '../form/fields';
import { wordOf } from '../form/fieldWords';
import { useSetField } from '../form/useSetField';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { SectionFrame } from '../parts/SectionFrame';
import { Suggestions } from '../parts/Suggestions';
import { useLastHere } from '../lastHere';
import { useSites } from '../registerQueries';

const TASKS_WITH_LAMPS = new Set([
  'replace lamp',
  'replace driver or ballast',
  'replace luminaire',
]);

function JobSummary() {
  const words = useMessages();
  const locale = useLocale();
  const { content, record, site } = useWorksheetForm();
  const job = content.job ?? {};
  const place = [site?.name ?? record.siteName, job.area].filter(Boolean).join(', ');
  const occupied =
    job.occupied === undefined ? undefined : words.worksheet.occupied[job.occupied ? 'yes' : 'no'];
  return (
    <>
      {job.task !== undefined && <Text variant="answer">{wordOf(words, 'task', job.task)}</Text>}
      <Text variant="answer">{place}</Text>
      {job.equipment !== undefined && <Text variant="answer">{job.equipment}</Text>}
      {job.startsAt !== undefined && job.endsAt !== undefined && (
        <Text variant="answer">
          {[windowText(locale, job.startsAt, job.endsAt, record.timeZone), occupied]
            .filter(Boolean)
            .join('. ')}
        </Text>
      )}
    </>
  );
}

/** What was so the last time, to be confirmed: people come and go. */
function OccupiedSuggestion() {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const last = useLastHere();
  const take = useSetField('job.occupied');
  const before = last?.content.job?.occupied;
  if (before === undefined || content.job?.occupied !== undefined) return null;
  const value = before ? words.ui.yes : words.ui.no;
  return <Suggestions from={last?.from ?? ''} values={[value]} onTake={() => take(before)} />;
}

/** 1. What, where, when. */
export function JobSection() {
  const words = useMessages();
  const { content, site, record } = useWorksheetForm();
  const sites = useSites();
  const job = content.job ?? {};
  const off = pathOf(content) === 'off';
  return (
    <SectionFrame section="job" folded={<JobSummary />}>
      <FieldSelect
        name="job.siteId"
        values={sites.map(({ id }) => id)}
        wordFor={(id) => sites.find((each) => each.id === id)?.name ?? record.siteName ?? id}
      />
      <FieldText name="job.area" />
      <FieldText name="job.equipment" />
      <FieldSelect name="job.task" values={JOB_TASKS} group="task" />
      {TASKS_WITH_LAMPS.has(job.task ?? '') && (
        <FieldSelect name="job.lamps" values={LAMPS} group="lamps" />
      )}
      <FieldText name="job.description" multiline />
      <FieldText name="job.workOrder" exact />
      {site !== undefined || job.startsAt !== undefined ? (
        <>
          <FieldDateTime name="job.startsAt" />
          <FieldDateTime name="job.endsAt" />
        </>
      ) : (
        <Notice icon="clock">{words.worksheet.siteFirst}</Notice>
      )}
      {off && <FieldNumber name="job.pointsOfWork" whole min={1} max={40} />}
      <FieldYesNo name="job.occupied" />
      <OccupiedSuggestion />
      {off && <FieldYesNo name="job.crossesShift" />}
      {off && job.crossesShift === true && <FieldText name="job.handover" multiline />}
      <FieldMulti
        name="job.special"
        values={SPECIAL_CONDITIONS}
        group="special"
        alone={['none of these']}
      />
      <FieldYesNo name="job.construction" />
      <FieldText name="notes" multiline />
    </SectionFrame>
  );
}
