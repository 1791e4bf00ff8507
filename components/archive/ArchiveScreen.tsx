import { useInfiniteQuery } from '@tanstack/react-query';
import { useCallback } from 'react';
import { StyleSheet, View } from 'react-native';
import type { WorksheetRow } from '@/shared/record';
import { openUrl } from '../api/openUrl';
import { apiUrl } from '../api/request';
import { useUser } from '../api/session';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { keepListPlace, useListPlace, useTopOf } from '../shell/listPlace';
import { layout, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { Button, Notice, Screen, Text, describeFault } from '../ui';
import { ArchiveList } from './ArchiveList';
import { archiveQuery } from './archiveQueries';
import { clearFilters, Filters } from './Filters';
import { filterCount, queryOf, type ArchiveFilters } from './filters';
import { RecordPanel } from './RecordPanel';
import { SearchBox } from './SearchBox';
import { useArchiveAddress, type ArchiveAddress } from './useArchiveAddress';
import { useAtEnd } from './useAtEnd';

/** For the safety office: the list as a table, the records as files. */
function Exports({ filters }: { filters: ArchiveFilters }) {
  const { archive } = useMessages();
  const { role } = useUser();
  const { isPhone } = useBreakpoint();
  const language = useLocale() === 'es-MX' ? 'es' : 'en';
  if (role !== 'safety') return null;
  const open = (file: 'csv' | 'zip') => {
    const query = new URLSearchParams(queryOf(filters, { forExport: true }));
    if (file === 'zip') query.set('language', language);
    openUrl(apiUrl(`/worksheets/export.${file}?${query.toString()}`));
  };
  return (
    <View style={[styles.exports, isPhone && styles.exportsPhone]}>
      <Button icon="document" label={archive.csv} onPress={() => open('csv')} style={styles.grow} />
      <Button
        icon="arrow-down"
        label={archive.zip}
        aria-label={`${archive.zip}, ${archive.zipHint}`}
        onPress={() => open('zip')}
        style={styles.grow}
      />
    </View>
  );
}

function usePages(query: string) {
  const { archive } = useMessages();
  const pages = useInfiniteQuery(archiveQuery(query));
  const rows = pages.data?.pages.flatMap(({ items }) => items);
  const count =
    rows === undefined || pages.isPlaceholderData
      ? archive.searching
      : pages.hasNextPage
        ? archive.shown(rows.length)
        : archive.found(rows.length);
  return { ...pages, rows, count };
}

interface ListProps {
  address: ArchiveAddress;
  query: string;
  width: number;
  pages: ReturnType<typeof usePages>;
  onOpen: (row: WorksheetRow) => void;
}

function Results({ address, query, width, pages, onOpen }: ListProps) {
  const words = useMessages();
  const { archive } = words;
  const { isPhone } = useBreakpoint();
  const { rows, count, fetchNextPage, hasNextPage, isFetchingNextPage } = pages;
  const loadMore = useCallback(() => void fetchNextPage(), [fetchNextPage]);
  const end = useAtEnd(loadMore, hasNextPage && !isFetchingNextPage && !pages.isError);
  useListPlace(query, rows !== undefined);

  return (
    <>
      {isPhone && (
        <Text variant="answer" aria-live="polite" style={styles.count}>
          {count}
        </Text>
      )}
      {pages.isError && <Notice live>{describeFault(pages.error, words)}</Notice>}
      {rows !== undefined && rows.length > 0 && (
        <ArchiveList rows={rows} address={address} width={width} onOpen={onOpen} />
      )}
      {rows !== undefined && rows.length === 0 && !pages.isPlaceholderData && (
        <View style={styles.nothing}>
          <Text variant="value">{archive.nothing}</Text>
          {(filterCount(address.filters) > 0 || address.filters.q !== '') && (
            <>
              <Text color="ink2">{archive.nothingHint}</Text>
              <Button label={archive.clearAll} onPress={() => clearFilters(address.set)} />
            </>
          )}
        </View>
      )}
      {hasNextPage && (
        <View ref={end} style={styles.more}>
          <Button label={archive.more} busy={isFetchingNextPage} onPress={loadMore} />
        </View>
      )}
    </>
  );
}

/** Below 1024 the record covers the list, which keeps its place. */
function CoveringRecord({ address, id }: { address: ArchiveAddress; id: string }) {
  const { archive } = useMessages();
  useTopOf(id);
  return (
    <Screen
      title={archive.record}
      hideTitle
      place="archive"
      back={{ label: archive.backToList, onPress: address.closeRecord }}
    >
      <View style={styles.covering}>
        <RecordPanel id={id} />
      </View>
    </Screen>
  );
}

/** Every worksheet that this person may see, found in seconds; list and record side by side from 1024. */
export function ArchiveScreen() {
  const { archive } = useMessages();
  const { isWide, isPhone, width: windowWidth, margin } = useBreakpoint();
  const address = useArchiveAddress();
  const { filters, record } = address;
  const query = queryOf(filters);
  const pages = usePages(query);

  if (!isWide && record !== undefined) return <CoveringRecord address={address} id={record} />;

  const beside = isWide && record !== undefined ? layout.record : 0;
  const width = Math.min(windowWidth - beside, isWide ? Infinity : layout.column + 2 * margin);
  const handleOpen = (row: WorksheetRow) => {
    keepListPlace(query);
    if (isWide) address.set({ record: row.id });
    else address.pushRecord(row.id);
  };
  return (
    <Screen
      title={archive.title}
      hideTitle={isWide}
      place="archive"
      width={isWide ? 'full' : 'column'}
      asideWidth={layout.record}
      aside={
        isWide && record !== undefined ? (
          <View style={styles.aside}>
            <RecordPanel
              key={record}
              id={record}
              onClose={() => address.set({ record: undefined })}
            />
          </View>
        ) : undefined
      }
    >
      <View style={[styles.search, isWide && styles.searchWide]}>
        <View style={isWide && styles.box}>
          <SearchBox
            count={isPhone ? undefined : pages.count}
            value={filters.q}
            onChange={(q) => address.set({ q: q === '' ? undefined : q })}
          />
        </View>
        {!isPhone && <Exports filters={filters} />}
      </View>
      <Filters address={address} width={width - 2 * margin} />
      <Results
        pages={pages}
        address={address}
        query={query}
        width={width - 2 * margin}
        onOpen={handleOpen}
      />
      {isPhone && <Exports filters={filters} />}
    </Screen>
  );
}

const styles = StyleSheet.create({
  aside: { padding: space.lg, paddingBottom: space.xxl },
  covering: { paddingTop: space.sm },
  search: { gap: space.sm },
  searchWide: { flexDirection: 'row', alignItems: 'flex-end', paddingTop: space.md },
  box: { flex: 1, minWidth: 0 },
  exports: { flexDirection: 'row', gap: space.sm },
  exportsPhone: { paddingVertical: space.md, flexWrap: 'wrap' },
  grow: { flexGrow: 1, minHeight: 56 },
  count: { paddingTop: space.md, paddingBottom: space.xs },
  nothing: { gap: space.sm, paddingVertical: space.lg, alignItems: 'flex-start' },
  more: { paddingTop: space.md },
});
