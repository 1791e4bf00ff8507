import { describe, expect, it } from 'vitest';
import { pathOf } from '@/hazard';
import { readAnswers } from '@/hazard/engine/answers';
import { peopleOf, personParams } from '@/hazard/engine/people';
import { answeredTaskFacts } from '@/hazard/tasks';
import { FAR, SECOND_QUALIFIED } from '../../support/ruleEdits';
import type { Base, Edits } from '../../support/ruleTable';
import { edited, gone } from '../../support/ruleTable';

const LEAD_OUTSIDE: Edits = { 'crew/0/closest': 'outside all boundaries' };
const HELPER_INSIDE: Edits = { ...SECOND_QUALIFIED, 'crew/1/closest': 'restricted' };
const NO_TESTER: Edits = { 'absenceTest/byCrewId': gone };

function peopleIn(base: Base, edits: Edits) {
  const { content } = edited(base, edits);
  const answers = readAnswers(content);
  return peopleOf({
    answers,
    task: answeredTaskFacts(answers.job.task),
    path: pathOf(content),
    day: '2026-12-01',
    isBelowFiftyVolts: false,
  });
}

type Row = [title: string, base: Base, edits: Edits, entrants: string[], someoneEnters: boolean];
const rows: Row[] = [
  ['the one who says so', 'O', {}, ['Lead'], true],
  ['the one who tests for absence', 'O', LEAD_OUTSIDE, ['Lead'], true],
  [
    'off, nobody named for the test: it is not known who',
    'O',
    { ...LEAD_OUTSIDE, ...NO_TESTER },
    [],
    true,
  ],
  [
    'off, nobody named for the test, and a member without an id',
    'O',
    { ...LEAD_OUTSIDE, ...NO_TESTER, 'crew/1/id': gone },
    [],
    true,
  ],
  [
    'off, nobody named for the test, and a lead who has not answered',
    'O',
    { ...NO_TESTER, 'crew/0/closest': gone },
    [],
    true,
  ],
  ['the one who tests the live circuit', 'T', LEAD_OUTSIDE, ['Lead'], true],
  [
    'tracing from outside: the tester stays out as well',
    'T',
    { ...LEAD_OUTSIDE, 'job/task': 'trace circuit' },
    [],
    false,
  ],
  ['an inspection from outside', 'T', FAR, [], false],
  [
    'an inspection, the lead has not answered',
    'T',
    { ...FAR, 'crew/0/closest': gone },
    ['Lead'],
    true,
  ],
  [
    'an inspection, the helper has not answered',
    'T',
    { ...FAR, 'crew/1/closest': gone },
    [],
    false,
  ],
  ['a live repair is done by its lead', 'W', { ...LEAD_OUTSIDE, ...NO_TESTER }, ['Lead'], true],
  [
    'a live repair, unless someone else does it',
    'W',
    { ...LEAD_OUTSIDE, ...NO_TESTER, ...HELPER_INSIDE },
    ['Helper'],
    true,
  ],
  [
    'a live repair without a lead: it is not known who',
    'W',
    { ...LEAD_OUTSIDE, 'crew/0/lead': false },
    [],
    true,
  ],
  [
    'a test under the name of another reason, from outside',
    'W',
    { ...LEAD_OUTSIDE, 'job/task': 'test or troubleshoot' },
    [],
    false,
  ],
  ['both', 'W', HELPER_INSIDE, ['Lead', 'Helper'], true],
];

describe('who enters the restricted boundary', () => {
  it.each(rows)('%s', (_, base, edits, entrants, someoneEnters) => {
    const people = peopleIn(base, edits);
    expect(people.entrants.map(({ name }) => name)).toEqual(entrants);
    expect(people.someoneEnters).toBe(someoneEnters);
    for (const { name, nearest } of people.crew) {
      if (entrants.includes(name ?? '')) expect(nearest).toBe('restricted');
    }
  });

  it('is named in the words where a name was given', () => {
    const params = peopleIn('O', { 'crew/1/name': gone }).crew.map(personParams);
    expect(params).toStrictEqual([{ index: 0, name: 'Lead' }, { index: 1 }]);
  });
});
