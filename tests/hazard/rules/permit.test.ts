import { BELOW_FIFTY } from '../../support/ruleEdits';
import { describeRule, eachValue, gone, onEach } from '../../support/ruleTable';

const UNTIL = 'decision/permit/validUntil';
const BY = 'decision/permit/approvedBy';

describeRule('permit.missing', '70E 130.2; who approves: own policy', [
  ...onEach(['W', 'W work'], 'complete', {}, []),
  ...onEach(['O', 'T'], 'not required', { 'decision/permit': gone }, []),
  ['W', 'below 50 V', { ...BELOW_FIFTY, 'decision/permit': gone }, []],
  ...eachValue(['W'], 'decision/permit/number', [gone, '', 3], ['open /decision/permit/number']),
  ...eachValue(['W'], BY, [gone, '', 3], ['open /decision/permit/approvedBy']),
  ...eachValue(['W'], UNTIL, [gone, '', 'soon', 3], ['open /decision/permit/validUntil']),
  ...eachValue(
    ['W'],
    'decision/permit',
    [gone, 'x'],
    [
      'open /decision/permit/number',
      'open /decision/permit/approvedBy',
      'open /decision/permit/validUntil',
    ],
  ),
  ...eachValue(
    ['W'],
    UNTIL,
    ['2026-12-01T11:59:59-06:00', '2026-12-01T12:00:00-05:00'],
    ['stop /decision/permit/validUntil'],
  ),
  ...eachValue(
    ['W'],
    UNTIL,
    ['2026-12-01T12:00:00-06:00', '2026-12-01T18:00:00Z', '2026-12-01T11:00:00-07:00'],
    [],
  ),
  ...eachValue(
    ['W'],
    BY,
    [
      'c1',
      ' C2 ',
      'Lead',
      '  hELPER\n',
      '0190b5a4-0000-7000-8000-0000000000b1',
      '0190B5A4-0000-7000-8000-0000000000B2',
    ],
    ['stop /decision/permit/approvedBy'],
  ),
  ['W', 'both at once', { [UNTIL]: '2026-12-01T10:00:00-06:00', [BY]: 'lead' }, ['stop', 'stop']],
]);
