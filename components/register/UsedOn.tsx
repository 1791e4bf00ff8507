import { infiniteQueryOptions, useInfiniteQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { calendarDate, dateText } from '@/shared/format';
import { listSchema, worksheetRowSchema, type WorksheetRow } from '@/shared/record';
import { request } from '../api/request';
import { links } from '../home/links';
import { inSentence, placeWords, rowMark, rowState, taskWords } from '../home/rowWords';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { Button, describeFault, ListRow, Section, Text } from '../ui';

const PAGE = 6;

/** Worksheets that name a person or a pair of gloves, the newest first. */
function usedOnQuery(by: 'person' | 'rubberGoods', id: string) {
  return infiniteQueryOptions({
    queryKey: ['worksheets', 'used-on', by, id] as const,
    queryFn: ({ signal, pageParam }) => {
      const page = new URLSearchParams({ [by]: id, limit: String(PAGE) });
      if (pageParam !== '') page.set('cursor', pageParam);
      const path = `/worksheets?${page.toString()}`;
      return request(listSchema(worksheetRowSchema), path, { signal });
    },
    initialPageParam: '',
    getNextPageParam: ({ nextCursor }) => nextCursor ?? undefined,
  });
}

function Row({ row, first }: { row: WorksheetRow; first: boolean }) {
  const messages = useMessages();
  const locale = useLocale();
  const day = dateText(locale, calendarDate(row.startsAt ?? row.createdAt, row.timeZone));
  return (
    <ListRow
      first={first}
      mark={rowMark(row)}
      title={`${row.number}, ${inSentence(taskWords(row, messages))}`}
      note={`${day}. ${placeWords(row, messages)}. ${rowState(row, messages)}`}
      href={links.worksheet(row.id)}
    />
  );
}

interface Props {
  by: 'person' | 'rubberGoods';
  id: string;
}

/** Where a person or a pair was named: what an inspector asks next. */
export function UsedOn({ by, id }: Props) {
  const messages = useMessages();
  const words = messages.register.usedOn;
  const list = useInfiniteQuery(usedOnQuery(by, id));
  const rows = list.data?.pages.flatMap(({ items }) => items) ?? [];
  const none = by === 'person' ? words.noPerson : words.noGoods;
  return (
    <Section id="used-on" title={words.title}>
      {list.isError && <Text>{describeFault(list.error, messages)}</Text>}
      {list.isPending && <Text color="ink2">{words.loading}</Text>}
      {list.isSuccess && rows.length === 0 && <Text color="ink2">{none}</Text>}
      {rows.length > 0 && (
        <View role="list">
          {rows.map((row, index) => (
            <View role="listitem" key={row.id}>
              <Row row={row} first={index === 0} />
            </View>
          ))}
        </View>
      )}
      {list.hasNextPage && (
        <Button
          kind="quiet"
          label={words.older}
          busy={list.isFetchingNextPage}
          onPress={() => void list.fetchNextPage()}
        />
      )}
    </Section>
  );
}
