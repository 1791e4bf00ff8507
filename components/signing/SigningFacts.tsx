import { pathOf } from '@/hazard';
import { list, volts, windowText } from '@/shared/format';
import type { Messages } from '@/shared/messages';
import type { WorksheetRecord } from '@/shared/record';
import type { Locale } from '@/shared/user';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { Facts, type Fact } from '../ui';
import { wordOf } from '../worksheet/form/fieldWords';
import { lowerFirst } from './lowerFirst';
import { ZoneDistances } from './ZoneDistances';

/** What is done: the lead's own words, else the task's name. */
export function taskText({ content }: WorksheetRecord, words: Messages): string {
  const { description, task } = content.job ?? {};
  if (description !== undefined && description.trim() !== '') return description;
  return task === undefined ? words.ui.notAnswered : wordOf(words, 'task', task);
}

export function placeText({ content, siteName }: WorksheetRecord, words: Messages): string {
  const place = [siteName, content.job?.area].filter(Boolean).join(', ');
  return place === '' ? words.ui.notAnswered : place;
}

function workFact({ content }: WorksheetRecord, words: Messages, locale: Locale): Fact {
  const said = words.signing;
  const sources = content.sources ?? [];
  const ways = sources.map(({ openedAt, kind }, index) => {
    const device = openedAt === undefined ? undefined : wordOf(words, 'openedAt', openedAt);
    const name =
      device ?? (kind === undefined ? String(index + 1) : wordOf(words, 'sourceKind', kind));
    return lowerFirst(name);
  });
  const locks = [...new Set(sources.flatMap(({ lockNumber }) => lockNumber ?? []))];
  if (pathOf(content) !== 'off') {
    const reason = content.decision?.reason;
    return {
      label: said.rows.work,
      value: said.energized(
        reason === undefined ? '?' : lowerFirst(wordOf(words, 'reason', reason)),
      ),
      note: content.decision?.explanation,
    };
  }
  return {
    label: said.rows.work,
    value: said.off,
    note:
      ways.length === 0 ? undefined : said.ways(list(locale, [...new Set(ways)]), locks.join(', ')),
  };
}

function whoFact({ content, leadName }: WorksheetRecord, words: Messages): Fact {
  const said = words.signing;
  const crew = content.crew ?? [];
  const lead = crew.find((member) => member.lead === true);
  const tests = lead?.id !== undefined && lead.id === content.absenceTest?.byCrewId;
  const others = crew
    .filter((member) => member !== lead)
    .map(({ name, closest }) =>
      said.memberStands(
        name ?? words.worksheet.namelessMember,
        closest === undefined ? said.memberUnknown : lowerFirst(wordOf(words, 'closest', closest)),
      ),
    );
  return {
    label: said.rows.who,
    value: (tests ? said.leadsAndTests : said.leads)(leadName),
    note: others.length === 0 ? undefined : others.join('. '),
  };
}

function permitFact({ content, assessment }: WorksheetRecord, words: Messages): Fact[] {
  if (pathOf(content) === 'off') return [];
  const { number, approvedBy } = content.decision?.permit ?? {};
  const said = words.signing;
  const value = !assessment.permit.required
    ? said.permitNotNeeded
    : number === undefined
      ? words.ui.notAnswered
      : said.permitNumbered(number, approvedBy ?? '');
  return [{ label: said.rows.permit, value }];
}

/** What is signed, in at most nine lines. */
export function SigningFacts({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const locale = useLocale();
  const { rows, numbered } = words.signing;
  const { content, timeZone } = record;
  const { startsAt, endsAt } = content.job ?? {};
  const { system, circuitVolts } = content.supply ?? {};
  const facts: Fact[] = [
    { label: rows.worksheet, value: numbered(record.number, record.revision) },
    { label: rows.task, value: taskText(record, words) },
    { label: rows.place, value: placeText(record, words) },
    {
      label: rows.when,
      value:
        startsAt === undefined || endsAt === undefined
          ? words.ui.notAnswered
          : windowText(locale, startsAt, endsAt, timeZone),
    },
    workFact(record, words, locale),
    ...permitFact(record, words),
    {
      label: rows.supply,
      value:
        system === undefined
          ? words.ui.notAnswered
          : words.worksheet.systemAndCircuit(
              wordOf(words, 'system', system),
              circuitVolts === undefined ? undefined : volts(locale, circuitVolts),
            ),
    },
    { label: rows.distances, value: <ZoneDistances assessment={record.assessment} /> },
    whoFact(record, words),
  ];
  return <Facts facts={facts} />;
}
