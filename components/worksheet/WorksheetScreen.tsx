import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { useUser } from '../api/session';
import { draftStore } from '../drafts/draftStore';
import type { KeptDraft } from '../drafts/draftTypes';
import { useMessages } from '../i18n/useMessages';
import { LoadingScreen, OfflineScreen, ProblemScreen } from '../ui';
import { WorksheetForm } from './WorksheetForm';
import { WorksheetReadOnly } from './WorksheetReadOnly';
import { worksheetQuery } from './worksheetQueries';

/** What this person typed here before and the server does not have yet; undefined until it is known. */
function useKeptDraft(userId: string, worksheetId: string): { kept: KeptDraft | null } | undefined {
  const [found, setFound] = useState<{ kept: KeptDraft | null }>();
  useEffect(() => {
    let current = true;
    draftStore
      .read(userId, worksheetId)
      .catch(() => undefined)
      .then((kept) => current && setFound({ kept: kept ?? null }))
      .catch(() => undefined);
    return () => {
      current = false;
    };
  }, [userId, worksheetId]);
  return found;
}

/** One worksheet: a form while it is a draft of the person's own, the record in every other case. */
export function WorksheetScreen({ worksheetId }: { worksheetId: string }) {
  const { worksheet: words } = useMessages();
  const user = useUser();
  const worksheet = useQuery(worksheetQuery(worksheetId));
  const draft = useKeptDraft(user.id, worksheetId);

  if (worksheet.data === undefined) {
    if (worksheet.fetchStatus === 'paused') return <OfflineScreen what={words.thisWorksheet} />;
    if (worksheet.isError) {
      return <ProblemScreen error={worksheet.error} onRetry={() => void worksheet.refetch()} />;
    }
    return <LoadingScreen label={words.loading} />;
  }
  const record = worksheet.data;
  const editable = record.state === 'draft' && record.actions.includes('save');
  if (!editable) return <WorksheetReadOnly record={record} stale={worksheet.isError} />;
  if (draft === undefined) return <LoadingScreen label={words.loading} />;
  return (
    <WorksheetForm
      key={`${record.id} ${record.revision}`}
      record={record}
      kept={draft.kept}
      stale={worksheet.isError}
    />
  );
}
