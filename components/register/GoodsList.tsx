import { View } from 'react-native';
import { dateText } from '@/shared/format';
import type { RubberGoods, Site } from '@/shared/register';
import { dueDay } from '@/shared/registerState';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { useBreakpoint } from '../theme/useBreakpoint';
import { Button, Table, Text, type Column } from '../ui';
import { GoodsState } from './GoodsState';
import { goodsBar, useGoodsWords } from './goodsWords';
import { inOrder, sortable } from './order';
import { PhoneRow } from './PhoneRow';
import { TimeBar, TimeRuler } from './TimeBar';
import { timeline } from './timeline';
import { TwoLines } from './TwoLines';
import type { RegisterViewControl } from './useRegisterView';

const ROOMY = 1100;
const RECORD = 440;
const EARLIEST = '';

const KEYS = {
  serial: (item: RubberGoods) => item.serial,
  class: (item: RubberGoods) => item.gloveClass.padStart(2, '0') + item.kind,
  tested: (item: RubberGoods) => item.lastTestedOn,
  // Without a test that it passed it stands before everything that is overdue.
  due: (item: RubberGoods) => item.dueOn || EARLIEST,
};

/** `28 Sep 2026` on two lines: day and month are what is compared. */
function useDateLines() {
  const locale = useLocale();
  return (date: string) => {
    const [day = '', month = '', year] = dateText(locale, date).split('\u00a0');
    return { first: `${day}\u00a0${month}`, second: year };
  };
}

/** `Class 0, up to 1000 V` on two lines. */
function classLines(words: string) {
  const [first = '', second] = words.split(', ');
  return { first, second };
}

interface Props {
  items: readonly RubberGoods[];
  sites: readonly Site[];
  todayAt: (item: RubberGoods) => string;
  today: string;
  view: RegisterViewControl;
}

export const siteOf = (sites: readonly Site[], item: RubberGoods) =>
  sites.find(({ id }) => id === item.siteId);

type GoodsColumn = Column<RubberGoods> & { from?: number };

function useGoodsColumns({
  sites,
  todayAt,
  today,
  view,
  sort,
}: Omit<Props, 'items'> & { sort: string }) {
  const { register, enumerations } = useMessages();
  const locale = useLocale();
  const { width } = useBreakpoint();
  const words = register.goods;
  const stateWords = useGoodsWords();
  const dateLines = useDateLines();
  const room = view.id === undefined && view.act === undefined ? width : width - RECORD;
  const line = timeline(today, room >= ROOMY ? 300 : 200, locale);
  const columns: GoodsColumn[] = [
    {
      key: 'serial',
      label: words.serial,
      width: 104,
      cell: ({ serial }) => serial,
      ...sortable('serial', sort, view),
    },
    {
      key: 'class',
      label: register.gloveClass,
      width: 104,
      cell: ({ gloveClass }) => <TwoLines {...classLines(enumerations.gloveClass[gloveClass])} />,
      ...sortable('class', sort, view),
    },
    {
      key: 'kind',
      label: register.kind,
      from: 900,
      cell: (item) => (
        <TwoLines
          first={enumerations.rubberGoodsKind[item.kind]}
          second={siteOf(sites, item)?.name}
        />
      ),
    },
    {
      key: 'tested',
      label: words.lastTest,
      width: 88,
      from: 1000,
      cell: ({ lastTestedOn }) =>
        lastTestedOn === '' ? words.notTested : <TwoLines {...dateLines(lastTestedOn)} />,
      ...sortable('tested', sort, view),
    },
    {
      key: 'issued',
      label: words.issued,
      width: 88,
      from: 1000,
      cell: ({ issuedOn }) =>
        issuedOn === null ? (
          <Text variant="label" weight="400" color="ink2">
            {words.inStore}
          </Text>
        ) : (
          <TwoLines {...dateLines(issuedOn)} />
        ),
    },
    {
      key: 'due',
      label: words.due,
      width: 88,
      cell: (item) => {
        const due = dueDay(item);
        return due === undefined ? '' : <TwoLines strong {...dateLines(due)} />;
      },
      ...sortable('due', sort, view),
    },
    {
      key: 'state',
      label: register.state,
      width: room >= 900 ? 160 : undefined,
      cell: (item) => <GoodsState words={stateWords(item, todayAt(item))} />,
    },
    {
      key: 'bar',
      label: register.lineIsToday,
      head: <TimeRuler line={line} />,
      width: line.width,
      from: 700,
      fill: true,
      cell: (item) => <TimeBar line={line} parts={goodsBar(line, item, today)} />,
    },
  ];
  return columns.filter(({ from = 0 }) => room >= from);
}

/** Rubber goods with their time in test: a table, or on a phone lines with a bar each. */
export function GoodsList(props: Props) {
  const { items, sites, todayAt, today, view } = props;
  const { register, enumerations } = useMessages();
  const locale = useLocale();
  const { isPhone, width, margin } = useBreakpoint();
  const sort = view.sort ?? 'due';
  const columns = useGoodsColumns({ ...props, sort });
  const stateWords = useGoodsWords();
  const rows = inOrder(items, sort, KEYS);
  if (rows.length === 0) {
    return (
      <>
        <Text>{register.noneFound}</Text>
        <Button
          kind="quiet"
          label={register.clearFilters}
          onPress={() => view.set({ state: undefined, site: undefined, of: undefined })}
        />
      </>
    );
  }
  if (!isPhone) {
    return (
      <Table
        label={register.goods.title}
        columns={columns}
        rows={rows}
        rowKey={({ id }) => id}
        selected={view.id}
        onOpen={({ id }) => view.open({ id })}
      />
    );
  }
  const line = timeline(today, width - 2 * margin, locale);
  return (
    <View>
      <TimeRuler line={line} />
      {rows.map((item) => {
        const parts = goodsBar(line, item, today);
        const kind = enumerations.rubberGoodsKind[item.kind];
        const place = register.goods.kindAndPlace(kind, siteOf(sites, item)?.name ?? '');
        return (
          <PhoneRow
            key={item.id}
            title={item.serial}
            note={`${place}. ${enumerations.gloveClass[item.gloveClass]}`}
            state={<GoodsState inLine words={stateWords(item, todayAt(item))} />}
            bar={parts && <TimeBar alone line={line} parts={parts} />}
            onPress={() => view.open({ id: item.id })}
          />
        );
      })}
    </View>
  );
}
