import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { MODES } from '@/hazard/enumerations';
import { calendarDate, dateText } from '@/shared/format';
import { STATES } from '@/shared/record';
import { deviceZone } from '../home/clock';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { Button } from '../ui';
import { usePeople, useSites } from '../worksheet/registerQueries';
import { FilterChip, FilterLine } from './FilterChip';
import {
  DEFAULT_SORT,
  filterCount,
  MANY_KEYS,
  spanStart,
  VOLTS,
  type ArchiveFilters,
  type Span,
} from './filters';
import { findingTitle } from './findingTitles';
import { MoreFilters } from './MoreFilters';
import type { ArchiveAddress } from './useArchiveAddress';

interface Props {
  address: ArchiveAddress;
  /** px that the list has. */
  width: number;
}

/** What is on and has no chip of its own in sight: each leads out of itself. */
function OthersOn({ filters, set, toggle, all }: ArchiveAddress & { all: boolean }) {
  const words = useMessages();
  const locale = useLocale();
  const people = usePeople();
  const sites = useSites();
  const { archive, enumerations } = words;
  const on: { key: string; label: string; off: () => void }[] = [
    ...filters.system.map((value) => ({
      key: `system ${value}`,
      label: enumerations.system[value],
      off: () => toggle('system', value),
    })),
    ...filters.finding.map((value) => ({
      key: `finding ${value}`,
      label: findingTitle(words, value),
      off: () => toggle('finding', value),
    })),
  ];
  if (all) {
    for (const value of filters.state)
      on.push({ key: value, label: enumerations.state[value], off: () => toggle('state', value) });
    for (const value of filters.siteId) {
      const label = sites.find(({ id }) => id === value)?.name ?? archive.filter.siteId;
      on.push({ key: value, label, off: () => toggle('siteId', value) });
    }
    for (const value of filters.mode)
      on.push({ key: value, label: enumerations.mode[value], off: () => toggle('mode', value) });
    for (const value of filters.circuitVolts)
      on.push({ key: value, label: `${value} V`, off: () => toggle('circuitVolts', value) });
  }
  if (filters.person !== undefined) {
    const label = people.find(({ id }) => id === filters.person)?.name ?? archive.filter.person;
    on.push({ key: 'person', label, off: () => set({ person: undefined }) });
  }
  if (filters.from !== undefined && (all || filters.to !== undefined)) {
    const label = archive.from(dateText(locale, filters.from));
    on.push({ key: 'from', label, off: () => set({ from: undefined }) });
  }
  if (filters.to !== undefined) {
    const label = archive.to(dateText(locale, filters.to));
    on.push({ key: 'to', label, off: () => set({ to: undefined }) });
  }
  if (on.length === 0) return null;
  return (
    <View style={styles.on}>
      {on.map(({ key, label, off }) => (
        <FilterChip
          key={key}
          chosen
          label={label}
          aria-label={archive.removeFilter(label)}
          onPress={off}
        />
      ))}
    </View>
  );
}

function When({ filters, set, stacked }: ArchiveAddress & { stacked: boolean }) {
  const { archive } = useMessages();
  const locale = useLocale();
  const today = calendarDate(new Date().toISOString(), deviceZone());
  const spans: Span[] = ['month', 'quarter', 'year'];
  const starts = spans.map((span) => spanStart(span, today));
  const own =
    filters.from !== undefined && filters.to === undefined && !starts.includes(filters.from);
  return (
    <FilterLine label={archive.filter.when} stacked={stacked}>
      {spans.map((span, index) => {
        const from = starts[index];
        const chosen = filters.from === from && filters.to === undefined;
        return (
          <FilterChip
            key={span}
            label={archive.span[span]}
            chosen={chosen}
            onPress={() => set({ from: chosen ? undefined : from, to: undefined })}
          />
        );
      })}
      {own && filters.from !== undefined && (
        <FilterChip
          chosen
          label={archive.from(dateText(locale, filters.from))}
          onPress={() => set({ from: undefined })}
        />
      )}
    </FilterLine>
  );
}

function Chips({ address, stacked }: { address: ArchiveAddress; stacked: boolean }) {
  const { archive, enumerations } = useMessages();
  const sites = useSites();
  const { filters, toggle } = address;
  return (
    <View style={styles.lines}>
      <FilterLine label={archive.filter.state} stacked={stacked}>
        {STATES.map((state) => (
          <FilterChip
            key={state}
            label={enumerations.state[state]}
            chosen={filters.state.includes(state)}
            onPress={() => toggle('state', state)}
          />
        ))}
      </FilterLine>
      {sites.length > 1 && (
        <FilterLine label={archive.filter.siteId} stacked={stacked}>
          {sites.map(({ id, name }) => (
            <FilterChip
              key={id}
              label={name}
              chosen={filters.siteId.includes(id)}
              onPress={() => toggle('siteId', id)}
            />
          ))}
        </FilterLine>
      )}
      <When {...address} stacked={stacked} />
      <View style={stacked ? styles.lines : styles.side}>
        <FilterLine label={archive.filter.mode} stacked={stacked}>
          {MODES.map((mode) => (
            <FilterChip
              key={mode}
              label={enumerations.mode[mode]}
              chosen={filters.mode.includes(mode)}
              onPress={() => toggle('mode', mode)}
            />
          ))}
        </FilterLine>
        <FilterLine label={archive.filter.circuitVolts} inline stacked={stacked}>
          {VOLTS.map((volts) => (
            <FilterChip
              key={volts}
              label={`${volts}\u00a0V`}
              chosen={filters.circuitVolts.includes(volts)}
              onPress={() => toggle('circuitVolts', volts)}
            />
          ))}
        </FilterLine>
      </View>
    </View>
  );
}

const NOTHING_ON: Partial<Record<keyof ArchiveFilters, undefined>> = Object.fromEntries(
  [...MANY_KEYS, 'person', 'from', 'to', 'q'].map((key) => [key, undefined]),
);

/** Takes every filter out of the address; the order stays. */
export function clearFilters(set: ArchiveAddress['set']): void {
  set(NOTHING_ON);
}

/** The filters of the archive: as chips where there is room, folded away on a phone. */
export function Filters({ address, width }: Props) {
  const { archive } = useMessages();
  const { isWide } = useBreakpoint();
  const { filters } = address;
  const [open, setOpen] = useState(false);
  const count = filterCount(filters);
  const columns = width >= 720 ? 3 : width >= 480 ? 2 : 1;
  const shown = isWide || open;
  return (
    <View style={styles.box}>
      {shown && <Chips address={address} stacked={width < 600} />}
      {open && <MoreFilters {...address} columns={columns} />}
      <View style={styles.foot}>
        <Button
          kind="quiet"
          iconEnd={open ? 'up' : 'down'}
          label={
            open
              ? archive.fewerFilters
              : isWide
                ? archive.moreFilters
                : count > 0
                  ? `${archive.filters}: ${archive.filtersOn(count)}`
                  : archive.filters
          }
          aria-expanded={open}
          onPress={() => setOpen(!open)}
        />
        {(count > 0 || filters.sort !== DEFAULT_SORT) && (
          <Button
            kind="quiet"
            icon="close"
            label={archive.clearAll}
            onPress={() => clearFilters(address.set)}
          />
        )}
      </View>
      <OthersOn {...address} all={!shown} />
    </View>
  );
}

const styles = StyleSheet.create({
  box: { gap: space.xs, paddingTop: space.sm },
  lines: { gap: 10 },
  side: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.xl, rowGap: 10 },
  on: { flexDirection: 'row', flexWrap: 'wrap', gap: space.xs },
  foot: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.xl },
});
