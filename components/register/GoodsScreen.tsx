import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { GLOVE_CLASSES } from '@/hazard';
import { dateText } from '@/shared/format';
import type { RubberGoods, Site } from '@/shared/register';
import { GOODS_STATES, goodsState } from '@/shared/registerState';
import { openUrl } from '../api/openUrl';
import { apiUrl } from '../api/request';
import { useUser } from '../api/session';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { Button, LoadingScreen, OfflineScreen, ProblemScreen, Text } from '../ui';
import { FRESH, rubberGoodsQuery } from '../worksheet/registerQueries';
import { useSitesByName } from './useSitesByName';
import { FilterChips } from './FilterChips';
import { GoodsForm } from './GoodsForm';
import { GoodsList, siteOf } from './GoodsList';
import { GoodsPanel } from './GoodsPanel';
import { ImportScreen } from './ImportScreen';
import { RegisterFrame } from './RegisterFrame';
import { useRegisterView, type RegisterViewControl } from './useRegisterView';
import { useToday } from './useToday';

type Fits = (item: RubberGoods) => boolean;
type TodayAt = (item: RubberGoods) => string;

const siteFits =
  (site: string | undefined): Fits =>
  (item) =>
    site === undefined || item.siteId === site;
const classFits =
  (gloveClass: string | undefined): Fits =>
  (item) =>
    gloveClass === undefined || item.gloveClass === gloveClass;
/** What is retired shows only when asked for. */
const stateFits =
  (state: string | undefined, todayAt: TodayAt): Fits =>
  (item) =>
    state === undefined ? !item.retired : goodsState(item, todayAt(item)) === state;

interface ListProps {
  goods: readonly RubberGoods[];
  sites: readonly Site[];
  todayAt: TodayAt;
  view: RegisterViewControl;
}

function Filters({ goods, sites, todayAt, view }: ListProps) {
  const { register } = useMessages();
  const { state, site, of: gloveClass } = view;
  const words = register.goods;
  const count = (...fits: Fits[]) => goods.filter((item) => fits.every((fit) => fit(item))).length;
  const state_ = stateFits(state, todayAt);
  return (
    <>
      <FilterChips
        label={register.state}
        value={state}
        onChange={(next) => view.set({ state: next })}
        chips={GOODS_STATES.map((value) => ({
          value,
          label: value === 'dueSoon' ? words.filterDueSoon : words.states[value],
          count: count(stateFits(value, todayAt), siteFits(site), classFits(gloveClass)),
        }))}
      />
      <FilterChips
        label={register.site}
        value={site}
        onChange={(next) => view.set({ site: next })}
        chips={sites.map(({ id, name }) => ({
          value: id,
          label: name,
          count: count(state_, siteFits(id), classFits(gloveClass)),
        }))}
      />
      <FilterChips
        label={register.gloveClass}
        value={gloveClass}
        onChange={(of) => view.set({ of })}
        chips={GLOVE_CLASSES.map((value) => ({
          value,
          label: value,
          count: count(state_, siteFits(site), classFits(value)),
        }))}
      />
    </>
  );
}

function FileButtons({ view }: { view: RegisterViewControl }) {
  const { register } = useMessages();
  return (
    <>
      <Button
        icon="document"
        label={register.listAsCsv}
        onPress={() => openUrl(apiUrl('/rubber-goods/export.csv'))}
      />
      <Button
        icon="arrow-up"
        label={register.importCsv}
        onPress={() => view.open({ act: 'import' })}
      />
    </>
  );
}

interface RecordProps extends ListProps {
  today: (timeZone?: string) => string;
  mayWrite: boolean;
}

function AddButton({ view }: { view: RegisterViewControl }) {
  const { register } = useMessages();
  return (
    <Button
      kind="primary"
      icon="plus"
      label={register.goods.add}
      onPress={() => view.open({ id: 'new' })}
    />
  );
}

/** What stands beside the list: a form, a record, or nothing. */
function useRecord({ goods, sites, todayAt, today, view, mayWrite }: RecordProps) {
  const { register, enumerations } = useMessages();
  const words = register.goods;
  const form = (item: RubberGoods | undefined, done: string) => (
    <GoodsForm
      key={item?.id ?? 'new'}
      item={item}
      sites={sites}
      todayAt={(siteId) => today(sites.find(({ id }) => id === siteId)?.timeZone)}
      onDone={({ id }) => view.open({ id, done })}
      onCancel={() => (item === undefined ? view.close() : view.open({ id: item.id }))}
    />
  );
  if (view.id === 'new' && mayWrite) {
    return { head: { title: words.newTitle }, body: form(undefined, 'added') };
  }
  const item = goods.find(({ id }) => id === view.id);
  if (item === undefined) return undefined;
  if (view.act === 'edit' && mayWrite) {
    return { head: { title: words.editTitle(item.serial) }, body: form(item, 'saved') };
  }
  const isTest = view.act === 'test' && mayWrite;
  const gloveClass = enumerations.gloveClass[item.gloveClass];
  const kind = enumerations.rubberGoodsKind[item.kind];
  const place = words.kindAndPlace(kind, siteOf(sites, item)?.name ?? '');
  const because = item.retiredBecause && enumerations.retiredBecause[item.retiredBecause];
  const under = item.size === '' ? place : words.sized(place, item.size);
  return {
    head: {
      over: isTest ? `${item.serial}. ${gloveClass}` : gloveClass,
      title: isTest ? words.recordTest : item.serial,
      under: item.retired ? `${under}. ${words.retiredAs(because ?? '')}` : under,
    },
    body: <GoodsPanel key={item.id} item={item} today={todayAt(item)} view={view} />,
  };
}

const NOTHING: RubberGoods[] = [];

/** Rubber goods: which are in test, until when, and which are not. */
export function GoodsScreen() {
  const { register } = useMessages();
  const locale = useLocale();
  const view = useRegisterView('/rubber-goods');
  const today = useToday();
  const list = useQuery({ ...rubberGoodsQuery, ...FRESH });
  const sites = useSitesByName();
  const mayWrite = useUser().role === 'safety';
  const words = register.goods;
  const goods = list.data?.items ?? NOTHING;
  const todayAt = (item: RubberGoods) => today(siteOf(sites, item)?.timeZone);
  const record = useRecord({ goods, sites, todayAt, today, view, mayWrite });
  const day = today();
  const shown = useMemo(
    () =>
      goods
        .filter(siteFits(view.site))
        .filter(classFits(view.of))
        .filter(stateFits(view.state, todayAt)),
    // `todayAt` is new at every render; what it answers changes with the day and the sites.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [goods, sites, day, view.site, view.of, view.state],
  );

  if (list.data === undefined) {
    if (list.fetchStatus === 'paused') return <OfflineScreen what={register.what.goods} />;
    if (list.isError) {
      return <ProblemScreen error={list.error} onRetry={() => void list.refetch()} />;
    }
    return <LoadingScreen label={register.loading.goods} />;
  }
  if (view.act === 'import' && mayWrite) return <ImportScreen subject="goods" view={view} />;
  return (
    <RegisterFrame
      place="rubberGoods"
      title={words.title}
      primary={mayWrite ? <AddButton view={view} /> : undefined}
      others={mayWrite ? <FileButtons view={view} /> : undefined}
      stale={list.isError}
      record={record}
      onClose={view.close}
      list={
        <>
          <Filters goods={goods} sites={sites} todayAt={todayAt} view={view} />
          <GoodsList items={shown} sites={sites} todayAt={todayAt} today={day} view={view} />
          <Text variant="label" weight="400" color="ink2">
            {words.foot(words.counted(shown.length), dateText(locale, day))}
          </Text>
        </>
      }
    />
  );
}
