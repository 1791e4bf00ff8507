import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { WorksheetRecord } from '@/shared/record';
import { useMessages } from '../i18n/useMessages';
import { LoadingScreen, OfflineScreen, ProblemScreen } from '../ui';
import { worksheetQuery } from './worksheetQueries';

interface Props {
  worksheetId: string;
  loading: string;
  /** `stale`: shown as last read, the server does not answer. */
  children: (record: WorksheetRecord, stale: boolean) => ReactNode;
}

/** Reads one record for a screen of its own: offline, failed, loading, shown, in that order. */
export function WithRecord({ worksheetId, loading, children }: Props) {
  const { worksheet: words } = useMessages();
  const worksheet = useQuery(worksheetQuery(worksheetId));
  if (worksheet.data === undefined) {
    if (worksheet.fetchStatus === 'paused') return <OfflineScreen what={words.thisWorksheet} />;
    if (worksheet.isError) {
      return <ProblemScreen error={worksheet.error} onRetry={() => void worksheet.refetch()} />;
    }
    return <LoadingScreen label={loading} />;
  }
  return children(worksheet.data, worksheet.isError);
}
