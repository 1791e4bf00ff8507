import { dateText } from '@/shared/format';
import type { RubberGoods } from '@/shared/register';
import { daysBetween, dueDay, goodsState, intervalStart, latestTest } from '@/shared/registerState';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import type { MarkState } from '../ui';
import { barParts, type BarParts, type Timeline } from './timeline';

export interface GoodsWords {
  first: string;
  second: string | undefined;
  over: boolean;
  mark: MarkState | undefined;
}

/** How an item stands today, in two short lines and a mark. */
export function useGoodsWords(): (item: RubberGoods, today: string) => GoodsWords {
  const { register, enumerations } = useMessages();
  const locale = useLocale();
  const words = register.goods;
  return (item, today) => {
    const state = goodsState(item, today);
    const first = words.states[state];
    const days = item.dueOn === '' ? 0 : daysBetween(today, item.dueOn);
    const dueIn = days === 0 ? words.dueToday : words.dueIn(register.days(days));
    switch (state) {
      case 'overdue':
        return { first, second: register.days(-days), over: true, mark: 'stop' };
      case 'out': {
        const failed = latestTest(item)?.passed === false;
        const second = failed ? words.outBecause : words.notIssuedYet;
        return { first, second, over: true, mark: 'stop' };
      }
      case 'dueSoon': {
        const second = item.issuedOn === null ? words.inStore : undefined;
        return { first: dueIn, second, over: false, mark: 'caution' };
      }
      case 'inStore':
        return {
          first,
          second: words.issueBy(dateText(locale, item.dueOn)),
          over: false,
          mark: undefined,
        };
      case 'retired': {
        const because = item.retiredBecause;
        const second = because === null ? undefined : enumerations.retiredBecause[because];
        return { first, second, over: false, mark: undefined };
      }
      case 'inTest':
        return { first, second: undefined, over: false, mark: undefined };
    }
  };
}

/** The bar of an item; none where it may not be used whatever the date. */
export function goodsBar(line: Timeline, item: RubberGoods, today: string): BarParts | undefined {
  const until = dueDay(item);
  if (until === undefined) return undefined;
  return barParts(line, {
    from: intervalStart(item),
    until,
    today,
    waits: item.issuedOn === null,
  });
}
