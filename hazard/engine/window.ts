import type { Answers } from './answers';
import type { Moment } from './moment';
import { notAnswered } from './rule';
import type { Hit } from './rule';

/** What a rule says of the work's window; what of it is not answered is open. */
export function windowHits(
  { startsAt, endsAt }: Answers['job'],
  judge: (startsAt: Moment, endsAt: Moment) => readonly Hit[],
): readonly Hit[] {
  if (startsAt !== undefined && endsAt !== undefined) return judge(startsAt, endsAt);
  return [
    ...(startsAt === undefined ? [notAnswered('/job/startsAt')] : []),
    ...(endsAt === undefined ? [notAnswered('/job/endsAt')] : []),
  ];
}
