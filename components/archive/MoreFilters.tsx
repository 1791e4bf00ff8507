import { StyleSheet, View } from 'react-native';
import { SYSTEMS } from '@/hazard/enumerations';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { DateField, Select } from '../ui';
import { usePeople } from '../worksheet/registerQueries';
import { SORTS, type ArchiveFilters } from './filters';
import { findingTitles } from './findingTitles';
import type { ArchiveAddress } from './useArchiveAddress';

interface Props {
  filters: ArchiveFilters;
  set: ArchiveAddress['set'];
  toggle: ArchiveAddress['toggle'];
  columns: 1 | 2 | 3;
}

/** The filters that are wanted less often: supply, person, finding, dates, order. */
export function MoreFilters({ filters, set, toggle, columns }: Props) {
  const words = useMessages();
  const locale = useLocale();
  const people = usePeople();
  const { archive, enumerations } = words;
  const cell = { width: `${100 / columns}%` } as const;
  const fields = [
    <Select
      key="system"
      label={archive.filter.system}
      value={filters.system[0]}
      options={SYSTEMS.map((value) => ({ value, label: enumerations.system[value] }))}
      onChange={(value) => set({ system: value })}
      onClear={() => set({ system: undefined })}
    />,
    <Select
      key="finding"
      label={archive.filter.finding}
      value={filters.finding[0]}
      options={findingTitles(words, locale)}
      onChange={(value) => set({ finding: value })}
      onClear={() => toggle('finding', filters.finding[0] ?? '')}
    />,
    <Select
      key="person"
      label={archive.filter.person}
      value={filters.person}
      options={people.map(({ id, name }) => ({ value: id, label: name }))}
      onChange={(value) => set({ person: value })}
      onClear={() => set({ person: undefined })}
    />,
    <DateField
      key="from"
      label={archive.filter.from}
      value={filters.from}
      onChange={(from) => set({ from })}
    />,
    <DateField
      key="to"
      label={archive.filter.to}
      value={filters.to}
      onChange={(to) => set({ to })}
    />,
    <Select
      key="sort"
      label={archive.filter.sort}
      value={filters.sort}
      options={SORTS.map((value) => ({ value, label: archive.sort[value] }))}
      onChange={(value) => set({ sort: value })}
    />,
  ];
  return (
    <View style={styles.grid}>
      {fields.map((field) => (
        <View key={field.key} style={[styles.cell, cell]}>
          {field}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  grid: { flexDirection: 'row', flexWrap: 'wrap', marginHorizontal: -space.xs, rowGap: space.sm },
  cell: { paddingHorizontal: space.xs },
});
