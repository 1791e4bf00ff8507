import { timeText } from '@/shared/format';
import { placeOf } from '@/shared/sections';
import { router } from 'expo-router';
import { useMessages } from '../../i18n/useMessages';
import { VerdictBar, type VerdictBarProps } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { useGoTo } from './goTo';

const UNDER_WAY = new Set(['briefing', 'countersign', 'in-force']);

/** Of a draft: how many points are open, and the way to the next one. */
function useDraftBar(): VerdictBarProps {
  const words = useMessages();
  const { assessment } = useWorksheetForm();
  const { goToFinding, goToSection } = useGoTo();
  const { verdict, findings } = assessment;
  const count = (severity: string) => findings.filter((each) => each.severity === severity).length;
  const next =
    findings.find(({ severity }) => severity === 'stop') ??
    findings.find(({ severity }) => severity === 'open');
  const action =
    next === undefined
      ? { label: words.worksheet.toSignatures, onPress: () => goToSection('signatures') }
      : { label: words.common.buttons.goTo(placeOf(next)), onPress: () => goToFinding(next) };
  const cautions = count('caution');
  const detail = [
    words.common.counts.verdict(count('stop'), count('open')),
    cautions > 0 ? words.common.counts.cautions(cautions) : '',
  ]
    .filter((part) => part !== '')
    .join(', ');
  if (verdict === 'stop') return { tone: 'stop', mark: 'stop', detail, action };
  if (verdict === 'open') return { tone: 'paper', mark: 'open', detail, action };
  return { tone: 'paper', mark: 'ready', detail: words.worksheet.notYetInForce, action };
}

/** Of a signed worksheet: where it stands, and the hand that stops the work. */
function useSignedBar(): VerdictBarProps {
  const words = useMessages();
  const { record } = useWorksheetForm();
  const at = { worksheetId: record.id };
  const stop = record.actions.includes('stop')
    ? {
        label: words.common.buttons.stop,
        onPress: () => router.push({ pathname: '/worksheets/[worksheetId]/stop', params: at }),
      }
    : undefined;
  const ends = record.content.job?.endsAt;
  const until =
    ends === undefined
      ? undefined
      : words.common.states.inForceUntil(timeText(ends, record.timeZone));
  if (record.state !== 'in-force') {
    const mark =
      record.state === 'stopped' ? 'stop' : record.state === 'closed' ? 'complete' : 'waits';
    return {
      tone: record.state === 'stopped' ? 'stop' : 'paper',
      mark,
      word: words.enumerations.state[record.state],
      detail: UNDER_WAY.has(record.state) ? words.worksheet.notYetInForce : undefined,
      stop,
    };
  }
  if (record.content.decision?.mode === 'energized') {
    return { tone: 'ink', mark: 'energized', detail: until, stop };
  }
  if (record.proved) return { tone: 'paper', mark: 'proved', detail: until, stop };
  return {
    tone: 'ink',
    word: words.worksheet.treatAsLive,
    detail: words.worksheet.notProved,
    stop,
    action: record.actions.includes('prove')
      ? {
          label: words.worksheet.proveDead,
          href: { pathname: '/worksheets/[worksheetId]/proof', params: at },
        }
      : undefined,
  };
}

function useBar(): VerdictBarProps {
  const { editable, record } = useWorksheetForm();
  const draft = useDraftBar();
  const signed = useSignedBar();
  return editable || record.state === 'draft' || record.state === 'returned' ? draft : signed;
}

/** At the foot of a phone. */
export function WorksheetBar() {
  return <VerdictBar {...useBar()} />;
}

/** At the head of the right column of a wide screen. */
export function WorksheetVerdict() {
  return <VerdictBar {...useBar()} />;
}
