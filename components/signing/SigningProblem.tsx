import { useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { Finding } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';
import { ApiProblem } from '../api/ApiProblem';
import { useMessages } from '../i18n/useMessages';
import { Button, Notice, describeFault } from '../ui';
import { FindingPanels } from '../worksheet/parts/FindingPanels';
import { worksheetQuery } from '../worksheet/worksheetQueries';

const MINUTE_S = 60;
/** How long the server locks a PIN where it names no time. */
const LOCKED_MINUTES = 15;

/** The findings that a `not-ready` answer carries; made by the server's own `assess`. */
const findingsSchema = z.array(
  z.custom<Finding>((value) => typeof value === 'object' && value !== null && 'code' in value),
);

export function findingsOf(error: ApiProblem): Finding[] {
  const parsed = findingsSchema.safeParse(error.document['findings']);
  return parsed.success ? parsed.data.filter(({ severity }) => severity !== 'caution') : [];
}

/** What stands beside the PIN field for this fault, if it is the PIN's. */
export function usePinFault(error: unknown): string | undefined {
  const words = useMessages().signing;
  if (!(error instanceof ApiProblem)) return undefined;
  if (error.problem === 'wrong-pin') return words.wrongPin;
  if (error.problem !== 'too-many-requests') return undefined;
  const seconds = error.retryAfterSeconds ?? LOCKED_MINUTES * MINUTE_S;
  return words.pinLocked(Math.max(1, Math.ceil(seconds / MINUTE_S)));
}

function ReadAgain({ record }: { record: WorksheetRecord }) {
  const words = useMessages().signing;
  const client = useQueryClient();
  const { queryKey } = worksheetQuery(record.id);
  return (
    <Button
      kind="primary"
      label={words.readItAgain}
      onPress={() => void client.invalidateQueries({ queryKey })}
    />
  );
}

/** Why it was not signed, in words, and the way on. A fault of the PIN stands beside its field. */
export function SigningProblem({ error, record }: { error: unknown; record: WorksheetRecord }) {
  const messages = useMessages();
  const words = messages.signing;
  const toWorksheet = (
    <Button
      label={words.backToWorksheet}
      href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
    />
  );
  if (error === null) return null;
  if (!(error instanceof ApiProblem)) {
    return (
      <Notice live icon="kept">
        {error instanceof TypeError ? words.offline : describeFault(error, messages)}
      </Notice>
    );
  }
  switch (error.problem) {
    case 'wrong-pin':
    case 'too-many-requests':
      return null;
    case 'not-ready':
      return (
        <>
          <Notice live title={words.notReadyTitle} action={toWorksheet}>
            {words.notReadyBody}
          </Notice>
          <FindingPanels findings={findingsOf(error)} />
        </>
      );
    case 'hash-mismatch':
    case 'stale-version':
      return (
        <Notice live title={words.changedTitle} action={<ReadAgain record={record} />}>
          {words.changedBody}
        </Notice>
      );
    case 'wrong-state':
      return (
        <Notice live title={words.movedTitle} action={<ReadAgain record={record} />}>
          {words.movedBody}
        </Notice>
      );
    case 'conflict': {
      const codes: Readonly<Record<string, string>> = words.conflict;
      const code = error.errors[0]?.code ?? 'other';
      return (
        <Notice live title={words.conflictTitle} action={toWorksheet}>
          {codes[code] ?? words.conflict.other}
        </Notice>
      );
    }
    default:
      return <Notice live>{describeFault(error, messages)}</Notice>;
  }
}
