import { useQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import type { Site } from '@/shared/register';
import type { Person } from '@/shared/user';
import { useMessages } from '../i18n/useMessages';
import { useBreakpoint } from '../theme/useBreakpoint';
import {
  Button,
  LoadingScreen,
  OfflineScreen,
  ProblemScreen,
  Table,
  Text,
  type Column,
} from '../ui';
import { FRESH, sitesQuery, usePeople } from '../worksheet/registerQueries';
import { FilterChips } from './FilterChips';
import { inOrder, sortable } from './order';
import { PhoneRow } from './PhoneRow';
import { RegisterFrame } from './RegisterFrame';
import { SiteForm } from './SiteForm';
import { SitePanel } from './SitePanel';
import { TwoLines } from './TwoLines';
import { useRegisterView, type RegisterViewControl } from './useRegisterView';
import { zoneWord } from './zoneWord';

const RECORD = 440;
const KEYS = { name: (site: Site) => site.name, address: (site: Site) => site.address };

function useColumns(view: RegisterViewControl, sort: string): Column<Site>[] {
  const { register, enumerations } = useMessages();
  const { width } = useBreakpoint();
  const words = register.sites;
  const zones: Readonly<Record<string, string>> = words.zones;
  const room = view.id === undefined ? width : width - RECORD;
  const columns: (Column<Site> & { from?: number })[] = [
    {
      key: 'name',
      label: words.name,
      share: 3,
      cell: ({ name }) => name,
      ...sortable('name', sort, view),
    },
    {
      key: 'address',
      label: words.address,
      share: 3,
      cell: ({ address }) => address,
      ...sortable('address', sort, view),
    },
    {
      key: 'zone',
      label: words.timeZone,
      width: 112,
      from: 1000,
      cell: ({ timeZone }) => zoneWord(zones, timeZone).split(', ')[0],
    },
    {
      key: 'systems',
      label: words.systems,
      width: 136,
      from: 760,
      cell: ({ systems }) => {
        const names = systems.map((system) => enumerations.system[system].split(', ')[0] ?? system);
        return <TwoLines first={names[0] ?? ''} second={names.slice(1).join(', ') || undefined} />;
      },
    },
    {
      key: 'panels',
      label: words.panels,
      width: 150,
      cell: ({ panels }) => (
        <TwoLines
          first={words.panelCount(panels.length)}
          second={words.circuitCount(
            panels.reduce((sum, { circuits = [] }) => sum + circuits.length, 0),
          )}
        />
      ),
    },
    {
      key: 'members',
      label: words.members,
      width: 120,
      from: 900,
      cell: ({ memberIds = [] }) => words.memberCount(memberIds.length),
    },
  ];
  return columns.filter(({ from = 0 }) => room >= from);
}

function SitesList({ sites, view }: { sites: readonly Site[]; view: RegisterViewControl }) {
  const { register } = useMessages();
  const { isPhone } = useBreakpoint();
  const words = register.sites;
  const sort = view.sort ?? 'name';
  const columns = useColumns(view, sort);
  const rows = inOrder(sites, sort, KEYS);
  if (rows.length === 0) {
    return (
      <>
        <Text>{register.noneFound}</Text>
        <Button
          kind="quiet"
          label={register.clearFilters}
          onPress={() => view.set({ state: undefined })}
        />
      </>
    );
  }
  if (!isPhone) {
    return (
      <Table
        label={words.title}
        columns={columns}
        rows={rows}
        rowKey={({ id }) => id}
        selected={view.id}
        onOpen={({ id }) => view.open({ id })}
      />
    );
  }
  return (
    <View>
      {rows.map((site) => (
        <PhoneRow
          key={site.id}
          title={site.name}
          note={site.address}
          state={
            <Text variant="note">
              {`${words.panelCount(site.panels.length)}. ${words.memberCount(site.memberIds?.length ?? 0)}`}
            </Text>
          }
          onPress={() => view.open({ id: site.id })}
        />
      ))}
    </View>
  );
}

/** What stands beside the list: a form, a record, or nothing. */
function useRecord(sites: readonly Site[], people: readonly Person[], view: RegisterViewControl) {
  const { register } = useMessages();
  const words = register.sites;
  if (view.id === 'new') {
    return {
      head: { title: words.newTitle },
      body: (
        <SiteForm
          key="new"
          site={undefined}
          people={people}
          onDone={({ id }) => view.open({ id, done: 'added' })}
          onCancel={view.close}
        />
      ),
    };
  }
  const site = sites.find(({ id }) => id === view.id);
  if (site === undefined) return undefined;
  if (view.act === 'edit') {
    return {
      head: { title: words.editTitle(site.name) },
      body: (
        <SiteForm
          key={site.id}
          site={site}
          people={people}
          onDone={({ id }) => view.open({ id, done: 'saved' })}
          onCancel={() => view.open({ id: site.id })}
        />
      ),
    };
  }
  return {
    head: {
      over: site.retired ? register.retired : undefined,
      title: site.name,
      under: site.address,
    },
    body: <SitePanel key={site.id} site={site} people={people} view={view} />,
  };
}

const NO_SITES: Site[] = [];

/** The sites of the company: panels, emergency plan, who works there. */
export function SitesScreen() {
  const { register } = useMessages();
  const view = useRegisterView('/sites');
  const list = useQuery({ ...sitesQuery, ...FRESH });
  const people = usePeople();
  const words = register.sites;
  const all = list.data?.items ?? NO_SITES;
  const record = useRecord(all, people, view);
  const isRetired = view.state === 'retired';
  const shown = all.filter(({ retired }) => retired === isRetired);

  if (list.data === undefined) {
    if (list.fetchStatus === 'paused') return <OfflineScreen what={register.what.sites} />;
    if (list.isError) {
      return <ProblemScreen error={list.error} onRetry={() => void list.refetch()} />;
    }
    return <LoadingScreen label={register.loading.sites} />;
  }
  return (
    <RegisterFrame
      place="sites"
      title={words.title}
      primary={
        <Button
          kind="primary"
          icon="plus"
          label={words.add}
          onPress={() => view.open({ id: 'new' })}
        />
      }
      stale={list.isError}
      record={record}
      onClose={view.close}
      list={
        <>
          {all.some(({ retired }) => retired) && (
            <FilterChips
              label={register.state}
              value={view.state}
              onChange={(state) => view.set({ state })}
              chips={[
                {
                  value: 'retired',
                  label: register.retired,
                  count: all.filter(({ retired }) => retired).length,
                },
              ]}
            />
          )}
          <SitesList sites={shown} view={view} />
          <Text variant="label" weight="400" color="ink2">
            {words.foot(shown.length)}
          </Text>
        </>
      }
    />
  );
}
