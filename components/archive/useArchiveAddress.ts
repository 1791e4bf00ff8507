import { router, useLocalSearchParams } from 'expo-router';
import { readFilters, type ArchiveFilters, type ManyKey, type Params } from './filters';

type Changes = Partial<Record<keyof ArchiveFilters | 'record', string | undefined>>;

export interface ArchiveAddress {
  filters: ArchiveFilters;
  /** Id of the record that is open. */
  record: string | undefined;
  set: (changes: Changes) => void;
  /** Turns one value of a filter on or off. */
  toggle: (key: ManyKey, value: string) => void;
  /** Opens a record as a step of its own, so that Back leads to the list. */
  pushRecord: (id: string) => void;
  closeRecord: () => void;
}

const UUID = /^[0-9a-f-]{36}$/i;

/** Filters and the open record stand in the address: it can be sent, kept and gone back to. */
export function useArchiveAddress(): ArchiveAddress {
  const params: Params = useLocalSearchParams();
  const filters = readFilters(params);
  const asked = params['record'];
  const record = typeof asked === 'string' && UUID.test(asked) ? asked : undefined;
  const set = (changes: Changes) => router.setParams(changes);
  return {
    filters,
    record,
    set,
    toggle(key, value) {
      const now: readonly string[] = filters[key];
      const next = now.includes(value) ? now.filter((each) => each !== value) : [...now, value];
      set({ [key]: next.length === 0 ? undefined : next.join(',') });
    },
    pushRecord(id) {
      const kept = Object.entries(params).filter(([, value]) => typeof value === 'string');
      router.push({ pathname: '/archive', params: { ...Object.fromEntries(kept), record: id } });
    },
    closeRecord() {
      if (router.canGoBack()) router.back();
      else set({ record: undefined });
    },
  };
}
