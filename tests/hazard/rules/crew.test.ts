import { BRIEFING_TOPICS } from '@/hazard';
import { BELOW_FIFTY, SECOND_QUALIFIED } from '../../support/ruleEdits';
import type { Edits, RuleRow } from '../../support/ruleTable';
import { ALL, describeRule, eachValue, ENERGIZED, gone, onEach } from '../../support/ruleTable';

describeRule('crew.lead-unqualified', '1910.332(b)(3), 1910.333(c)(2)', [
  ...onEach(ALL, 'one qualified lead', {}, []),
  ...eachValue(
    ALL,
    'crew/0/qualified',
    [false],
    ['stop /crew/0*'],
    ['shock.*', 'sources.by-unqualified'],
  ),
  ...eachValue(
    ALL,
    'crew/0/qualified',
    [gone, '', 'yes'],
    ['open /crew/0*'],
    ['shock.*', 'sources.by-unqualified', 'crew.*'],
  ),
  ...eachValue(
    ALL,
    'crew/0/qualifiedThrough',
    ['2026-11-30'],
    ['stop /crew/0*'],
    ['shock.*', 'sources.by-unqualified', 'crew.training-lapsed'],
  ),
  ...eachValue(
    ALL,
    'crew/0/qualifiedThrough',
    [gone],
    ['open /crew/0*'],
    ['shock.*', 'sources.by-unqualified', 'crew.training-lapsed'],
  ),
  ...eachValue(ALL, 'crew/0/lead', [gone, false, 'yes'], ['open'], ['crew.unanswered', 'shock.*']),
  ...onEach(
    ALL,
    'two leads',
    { ...SECOND_QUALIFIED, 'crew/1/lead': true },
    ['open'],
    ['crew.rescue-untrained', 'shock.*', 'arc.*'],
  ),
  ...eachValue(ALL, 'crew', [gone, [], 'x'], ['open'], ['*']),
]);

describeRule('crew.training-lapsed', '70E-2024 110.4, 36 months', [
  ...eachValue(ALL, 'crew/1/qualifiedThrough', ['2026-12-01', '2030-01-01'], [], [], {
    'crew/1/qualified': true,
  }),
  ...eachValue(
    ALL,
    'crew/1/qualifiedThrough',
    ['2026-11-30', '2020-02-29'],
    ['stop /crew/1/qualifiedThrough'],
    [],
    { 'crew/1/qualified': true },
  ),
  ...eachValue(
    ALL,
    'crew/1/qualifiedThrough',
    [gone, '', '2026-02-30', 2028],
    ['open /crew/1/qualifiedThrough'],
    [],
    { 'crew/1/qualified': true },
  ),
  ...eachValue(ALL, 'crew/1/qualifiedThrough', [gone, '2020-01-01'], [], [], {
    'crew/1/qualified': false,
  }),
  ...onEach(
    ALL,
    'both',
    {
      'crew/1/qualified': true,
      'crew/1/qualifiedThrough': '2026-01-01',
      'crew/0/qualifiedThrough': '2026-01-01',
    },
    ['stop /crew/0*', 'stop /crew/1*'],
    ['*'],
  ),
]);

describeRule('crew.alone', 'own policy; FACE 94MD022', [
  ...onEach(ALL, 'two', {}, []),
  ...onEach(ENERGIZED, 'one', { 'crew/1': gone }, ['stop /crew*'], ['crew.rescue-untrained']),
  ['O', 'one', { 'crew/1': gone }, ['caution /crew*']],
  ['W', 'below 50 V', { ...BELOW_FIFTY, 'crew/1': gone }, []],
]);

const without = (topic: string) => BRIEFING_TOPICS.filter((other) => other !== topic);
describeRule('crew.briefing-open', '70E-2024 110.3(I)', [
  ...onEach(ALL, 'all covered', {}, []),
  ...BRIEFING_TOPICS.flatMap((topic): RuleRow[] => [
    ...onEach(['W'], `without ${topic}`, { 'briefing/topics': without(topic) }, [
      'open /briefing/topics*',
    ]),
    ...onEach(
      ['O', 'T'],
      `without ${topic}`,
      { 'briefing/topics': without(topic) },
      topic === 'permit' ? [] : ['open /briefing/topics*'],
    ),
  ]),
  [
    'W',
    'below 50 V no permit is briefed',
    { ...BELOW_FIFTY, 'briefing/topics': without('permit') },
    [],
  ],
  ...eachValue(
    ['W'],
    'briefing/topics',
    [gone, [], 'x'],
    BRIEFING_TOPICS.map(() => 'open'),
  ),
  ...onEach(
    ['W'],
    'a foreign topic: the list is not answered',
    { 'briefing/topics': [...BRIEFING_TOPICS, 'moon'] },
    BRIEFING_TOPICS.map(() => 'open'),
  ),
  ...eachValue(
    ['O', 'T'],
    'briefing/topics',
    [gone, [], {}],
    BRIEFING_TOPICS.slice(1).map(() => 'open'),
  ),
]);

describeRule('crew.emergency-plan', '70E-2024 110.3(I)', [
  ...onEach(ALL, 'complete', {}, []),
  ...['contact', 'rescue', 'firstAid', 'aedAt'].flatMap((key) =>
    eachValue(
      ALL,
      `briefing/emergency/${key}`,
      [gone, '', 911],
      [`open /briefing/emergency/${key}`],
    ),
  ),
  ...eachValue(ALL, 'briefing/emergency', [gone, 'x'], ['open', 'open', 'open', 'open']),
]);

const NOBODY: Edits = { 'crew/0/rescueTrained': false, 'crew/1/rescueTrained': false };
describeRule('crew.rescue-untrained', '70E-2024 110.4; 1910.151(b)', [
  ...onEach(ALL, 'trained', {}, []),
  ...onEach(ALL, 'nobody', NOBODY, ['open /crew*']),
  ...onEach(ALL, 'not answered', { 'crew/0/rescueTrained': gone, 'crew/1/rescueTrained': 'yes' }, [
    'open /crew*',
  ]),
  ...onEach(ENERGIZED, 'only the one who is restricted', { 'crew/1/rescueTrained': false }, [
    'open /crew*',
  ]),
  ['O', 'only the one who is restricted', { 'crew/1/rescueTrained': false }, []],
  ['W', 'below 50 V everyone counts', { ...BELOW_FIFTY, 'crew/1/rescueTrained': false }, []],
  ['W', 'below 50 V, nobody', { ...BELOW_FIFTY, ...NOBODY }, ['open /crew*']],
  [
    'T',
    'the one who tests counts as restricted',
    { 'crew/0/closest': 'limited', 'crew/1/rescueTrained': false },
    ['open /crew*'],
  ],
  [
    'T',
    'nobody is restricted',
    { 'job/task': 'inspect', 'crew/0/closest': 'limited', 'crew/1/rescueTrained': false },
    [],
  ],
]);
