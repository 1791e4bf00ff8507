import { View } from 'react-native';
import { dateText } from '@/shared/format';
import type { Site } from '@/shared/register';
import { accountState, daysBetween, DUE_SOON_DAYS } from '@/shared/registerState';
import type { Person } from '@/shared/user';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { useBreakpoint } from '../theme/useBreakpoint';
import { Button, Table, Text, type Column } from '../ui';
import { inOrder, sortable } from './order';
import { PhoneRow } from './PhoneRow';
import { TimeBar, TimeRuler } from './TimeBar';
import { barParts, timeline, type Timeline } from './timeline';
import type { RegisterViewControl } from './useRegisterView';
import { TwoLines } from './TwoLines';

/** A list this wide shows every column. */
const ROOMY = 1100;
const RECORD = 440;
const LATEST = '9999-12-31';

const KEYS = {
  name: (person: Person) => person.name,
  role: (person: Person) => person.role,
  qualified: (person: Person) => person.qualifiedThrough ?? LATEST,
};

function useQualified(today: string) {
  const { register } = useMessages();
  const locale = useLocale();
  const words = register.people;
  return ({ qualifiedThrough: through }: Person) => {
    if (through === null) return { first: words.notQualified, second: undefined, over: undefined };
    const days = daysBetween(today, through);
    const first = dateText(locale, through);
    if (days < 0) {
      const ago = words.ranOutAgo(register.days(-days));
      return { first, second: `${words.ranOut} ${ago}`, over: 'second' as const };
    }
    const second = days <= DUE_SOON_DAYS ? words.endsIn(register.days(days)) : undefined;
    return { first, second, over: undefined };
  };
}

const barOf = (line: Timeline, { qualifiedThrough }: Person, today: string) =>
  qualifiedThrough === null ? undefined : barParts(line, { until: qualifiedThrough, today });

function useSiteNames(sites: readonly Site[]) {
  const { register } = useMessages();
  return ({ siteIds = [] }: Person) => {
    const names = sites.filter(({ id }) => siteIds.includes(id)).map(({ name }) => name);
    const [first] = names;
    if (first === undefined) return register.noSite;
    return names.length === 1 ? first : register.and(first, names.length - 1);
  };
}

interface Props {
  people: readonly Person[];
  sites: readonly Site[];
  today: string;
  view: RegisterViewControl;
}

function usePeopleColumns({ sites, today, view, sort }: Omit<Props, 'people'> & { sort: string }) {
  const { register, enumerations, account } = useMessages();
  const locale = useLocale();
  const { width, isWide } = useBreakpoint();
  const words = register.people;
  const qualified = useQualified(today);
  const sitesOf = useSiteNames(sites);
  const room = view.id === undefined ? width : width - RECORD;
  const roomy = room >= ROOMY;
  const line = timeline(today, roomy ? 270 : 190, locale);
  const columns: (Column<Person> & { from?: number })[] = [
    {
      key: 'name',
      label: words.name,
      share: 3,
      cell: ({ name }) => name,
      ...sortable('name', sort, view),
    },
    {
      key: 'role',
      label: words.role,
      width: 112,
      cell: ({ role }) => enumerations.role[role],
      ...sortable('role', sort, view),
    },
    { key: 'sites', label: words.sites, share: 3, from: 680, cell: sitesOf },
    {
      key: 'qualified',
      label: words.qualified,
      width: 142,
      cell: (person) => <TwoLines {...qualified(person)} />,
      ...sortable('qualified', sort, view),
    },
    {
      key: 'language',
      label: words.language,
      width: 84,
      from: ROOMY,
      cell: ({ locale: language }) => account.languages[language ?? 'en-US'],
    },
    {
      key: 'account',
      label: words.account,
      width: 124,
      cell: (person) => words.states[accountState(person)],
    },
    {
      key: 'bar',
      label: register.lineIsToday,
      head: <TimeRuler line={line} />,
      width: line.width,
      from: 760,
      fill: true,
      cell: (person) => <TimeBar line={line} parts={barOf(line, person, today)} />,
    },
  ];
  // Beside an open record the bars say more than the names of sites.
  const fits = columns.filter(({ key, from = 0 }) =>
    room < ROOMY && isWide && key === 'sites' ? false : room >= from,
  );
  return isWide ? fits : fits.filter(({ key }) => key !== 'bar');
}

/** The people as a table, or on a phone as lines. */
export function PeopleList({ people, sites, today, view }: Props) {
  const { register, enumerations } = useMessages();
  const locale = useLocale();
  const { isPhone, width, margin } = useBreakpoint();
  const sort = view.sort ?? 'name';
  const columns = usePeopleColumns({ sites, today, view, sort });
  const qualified = useQualified(today);
  const sitesOf = useSiteNames(sites);
  const rows = inOrder(people, sort, KEYS);
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
        label={register.people.title}
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
      {rows.map((person) => {
        const { first, second, over } = qualified(person);
        const parts = barOf(line, person, today);
        return (
          <PhoneRow
            key={person.id}
            title={person.name}
            note={`${enumerations.role[person.role]}, ${sitesOf(person)}. ${register.people.states[accountState(person)]}`}
            state={
              <TwoLines
                inLine
                first={person.qualifiedThrough === null ? first : register.people.through(first)}
                second={second}
                over={over}
              />
            }
            bar={parts && <TimeBar alone line={line} parts={parts} />}
            onPress={() => view.open({ id: person.id })}
          />
        );
      })}
    </View>
  );
}
