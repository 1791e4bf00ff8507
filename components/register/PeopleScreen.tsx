import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { dateText } from '@/shared/format';
import type { Site } from '@/shared/register';
import { ACCOUNT_STATES, accountState } from '@/shared/registerState';
import { ROLES, type Person } from '@/shared/user';
import { openUrl } from '../api/openUrl';
import { apiUrl } from '../api/request';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { Button, LoadingScreen, OfflineScreen, ProblemScreen, Text } from '../ui';
import { FRESH, peopleQuery } from '../worksheet/registerQueries';
import { useSitesByName } from './useSitesByName';
import { FilterChips } from './FilterChips';
import { ImportScreen } from './ImportScreen';
import { PeopleList } from './PeopleList';
import { PersonForm } from './PersonForm';
import { PersonPanel } from './PersonPanel';
import { RegisterFrame } from './RegisterFrame';
import { useRegisterView, type RegisterViewControl } from './useRegisterView';
import { useToday } from './useToday';

const siteFits = (site: string | undefined) => (person: Person) =>
  site === undefined || (person.siteIds ?? []).includes(site);
const roleFits = (role: string | undefined) => (person: Person) =>
  role === undefined || person.role === role;
/** Who is retired shows only when asked for. */
const stateFits = (state: string | undefined) => (person: Person) =>
  state === undefined ? person.retired !== true : accountState(person) === state;

function Filters({
  people,
  sites,
  view,
}: {
  people: readonly Person[];
  sites: readonly Site[];
  view: RegisterViewControl;
}) {
  const { register, enumerations } = useMessages();
  const { state, site, of: role } = view;
  const bySite = people.filter(stateFits(state)).filter(roleFits(role));
  const byRole = people.filter(stateFits(state)).filter(siteFits(site));
  const byState = people.filter(siteFits(site)).filter(roleFits(role));
  return (
    <>
      <FilterChips
        label={register.role}
        value={role}
        onChange={(of) => view.set({ of })}
        chips={ROLES.map((value) => ({
          value,
          label: enumerations.role[value],
          count: byRole.filter(roleFits(value)).length,
        }))}
      />
      <FilterChips
        label={register.site}
        value={site}
        onChange={(next) => view.set({ site: next })}
        chips={sites.map(({ id, name }) => ({
          value: id,
          label: name,
          count: bySite.filter(siteFits(id)).length,
        }))}
      />
      <FilterChips
        label={register.state}
        value={state}
        onChange={(next) => view.set({ state: next })}
        chips={ACCOUNT_STATES.map((value) => ({
          value,
          label: register.people.states[value],
          count: byState.filter(stateFits(value)).length,
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
        onPress={() => openUrl(apiUrl('/users/export.csv'))}
      />
      <Button
        icon="arrow-up"
        label={register.importCsv}
        onPress={() => view.open({ act: 'import' })}
      />
    </>
  );
}

function AddButton({ view }: { view: RegisterViewControl }) {
  const { register } = useMessages();
  return (
    <Button
      kind="primary"
      icon="plus"
      label={register.people.add}
      onPress={() => view.open({ id: 'new' })}
    />
  );
}

/** What stands beside the list: a form, a record, or nothing. */
function useRecord(
  people: readonly Person[],
  sites: readonly Site[],
  view: RegisterViewControl,
  today: string,
) {
  const { register, enumerations } = useMessages();
  const words = register.people;
  if (view.id === 'new') {
    return {
      head: { title: words.newTitle },
      body: (
        <PersonForm
          key="new"
          person={undefined}
          sites={sites}
          onDone={({ id }) => view.open({ id, done: 'added' })}
          onCancel={view.close}
        />
      ),
    };
  }
  const person = people.find(({ id }) => id === view.id);
  if (person === undefined) return undefined;
  if (view.act === 'edit') {
    return {
      head: { title: words.editTitle(person.name) },
      body: (
        <PersonForm
          key={person.id}
          person={person}
          sites={sites}
          onDone={({ id }) => view.open({ id, done: 'saved' })}
          onCancel={() => view.open({ id: person.id })}
        />
      ),
    };
  }
  return {
    head: {
      over: enumerations.role[person.role],
      title: person.name,
      under: person.retired === true ? register.retired : undefined,
    },
    body: <PersonPanel key={person.id} person={person} sites={sites} today={today} view={view} />,
  };
}

const NOBODY: Person[] = [];

/** The people of the company: who they are, where they work, how long they are qualified. */
export function PeopleScreen() {
  const { register } = useMessages();
  const locale = useLocale();
  const view = useRegisterView('/people');
  const today = useToday()();
  const people = useQuery({ ...peopleQuery, ...FRESH });
  const sites = useSitesByName();
  const words = register.people;
  const everybody = people.data?.items ?? NOBODY;
  const record = useRecord(everybody, sites, view, today);
  const shown = useMemo(
    () =>
      everybody.filter(stateFits(view.state)).filter(roleFits(view.of)).filter(siteFits(view.site)),
    [everybody, view.state, view.of, view.site],
  );

  if (people.data === undefined) {
    if (people.fetchStatus === 'paused') return <OfflineScreen what={register.what.people} />;
    if (people.isError) {
      return <ProblemScreen error={people.error} onRetry={() => void people.refetch()} />;
    }
    return <LoadingScreen label={register.loading.people} />;
  }
  if (view.act === 'import') return <ImportScreen subject="people" view={view} />;
  return (
    <RegisterFrame
      place="people"
      title={words.title}
      primary={<AddButton view={view} />}
      others={<FileButtons view={view} />}
      stale={people.isError}
      record={record}
      onClose={view.close}
      list={
        <>
          <Filters people={everybody} sites={sites} view={view} />
          <PeopleList people={shown} sites={sites} today={today} view={view} />
          <Text variant="label" weight="400" color="ink2">
            {words.foot(words.count(shown.length), dateText(locale, today))}
          </Text>
        </>
      }
    />
  );
}
