import type { Href } from 'expo-router';
import { timeText } from '@/shared/format';
import type { Messages } from '@/shared/messages';
import type { WorksheetRow } from '@/shared/record';
import type { SessionUser } from '@/shared/user';
import type { IconName, MarkState } from '../ui';
import { links } from './links';
import { endWords, inSentence, placeWords, reasonWords, taskWords } from './rowWords';

/** One thing that only this person can move on. */
export interface Waiting {
  key: string;
  mark?: MarkState;
  icon?: IconName;
  title: string;
  note: string;
  action: string;
  href: Href;
  /** 0 first: people may be near something live. */
  urgency: number;
}

interface Asked {
  row: WorksheetRow;
  words: Messages;
}

const note = ({ row, words }: Asked, ...more: (string | undefined)[]) => {
  const about = [row.number, inSentence(taskWords(row, words)), placeWords(row, words)].join(', ');
  return [about, ...more].filter((part) => part !== undefined && part !== '').join('. ');
};

const quoted = ({ row, words }: Asked) => reasonWords(row, words);

function forLead(asked: Asked): Waiting[] {
  const { row, words } = asked;
  const { waiting } = words.home;
  const found: Waiting[] = [];
  const add = (item: Omit<Waiting, 'key'>) =>
    found.push({ ...item, key: `${row.id} ${found.length}` });
  const by = row.reasonBy ?? '';

  for (const question of row.openQuestions) {
    add({
      icon: 'question',
      title: waiting.asks(question.byName),
      note: note(asked, words.home.quoted(question.text)),
      action: waiting.answer,
      href: links.worksheet(row.id),
      urgency: 2,
    });
  }
  if (row.state === 'in-force' && row.mode === 'energized') {
    add({
      mark: 'energized',
      title: waiting.energized,
      note: note(asked, endWords(row, words)),
      action: waiting.close,
      href: links.close(row.id),
      urgency: 0,
    });
  }
  if (row.state === 'in-force' && row.mode !== 'energized' && !row.proved) {
    add({
      mark: 'not-proved',
      title: waiting.notProved,
      note: note(asked, endWords(row, words)),
      action: waiting.prove,
      href: links.proof(row.id),
      urgency: 0,
    });
  }
  if (row.state === 'expired') {
    const over =
      row.endsAt === null ? undefined : words.home.overSince(timeText(row.endsAt, row.timeZone));
    add({
      mark: 'stop',
      title: waiting.expired,
      note: note(asked, over),
      action: waiting.close,
      href: links.close(row.id),
      urgency: 0,
    });
  }
  if (row.state === 'stopped') {
    add({
      mark: 'stop',
      title: waiting.stopped(by),
      note: note(asked, quoted(asked)),
      action: waiting.revise(row.revision + 1),
      href: links.worksheet(row.id),
      urgency: 1,
    });
  }
  if (row.state === 'returned') {
    add({
      mark: 'open',
      title: waiting.returned(by),
      note: note(asked, quoted(asked)),
      action: waiting.revise(row.revision + 1),
      href: links.worksheet(row.id),
      urgency: 2,
    });
  }
  if (row.state === 'draft' && row.verdict === 'ready') {
    add({
      mark: 'ready',
      title: waiting.ready,
      note: note(asked),
      action: waiting.sign,
      href: links.sign(row.id),
      urgency: 3,
    });
  }
  return found;
}

function forCrew(asked: Asked, user: SessionUser): Waiting[] {
  const { row, words } = asked;
  const { waiting } = words.home;
  if (row.state === 'briefing' && row.awaiting.includes(user.id)) {
    return [
      {
        key: `${row.id} sign`,
        icon: 'pen',
        title: waiting.acknowledge,
        note: note(asked, row.leadName),
        action: waiting.readAndSign,
        href: links.briefing(row.id, user.id),
        urgency: 1,
      },
    ];
  }
  if (row.state === 'stopped' && row.crew.some((member) => member.userId === user.id)) {
    return [
      {
        key: `${row.id} stop`,
        mark: 'stop',
        title: waiting.crewStopped(row.reasonBy ?? ''),
        note: note(asked, quoted(asked)),
        action: waiting.look,
        href: links.worksheet(row.id),
        urgency: 0,
      },
    ];
  }
  return [];
}

function forSupervisor(asked: Asked, user: SessionUser): Waiting[] {
  const { row, words } = asked;
  const onCrew = row.leadId === user.id || row.crew.some((member) => member.userId === user.id);
  if (row.state !== 'countersign' || onCrew) return [];
  return [
    {
      key: `${row.id} countersign`,
      icon: 'pen',
      title: words.home.waiting.countersign,
      note: note(asked, row.leadName),
      action: words.home.waiting.read,
      href: links.worksheet(row.id),
      urgency: 1,
    },
  ];
}

/** Everything that waits for this person, the most urgent first. */
export function waitsFor(
  user: SessionUser,
  rows: readonly WorksheetRow[],
  words: Messages,
): Waiting[] {
  const found = rows.flatMap((row) => {
    const asked = { row, words };
    if (row.leadId === user.id) return forLead(asked);
    const asCrew = forCrew(asked, user);
    return user.role === 'supervisor' ? [...asCrew, ...forSupervisor(asked, user)] : asCrew;
  });
  return found.sort((a, b) => a.urgency - b.urgency);
}
