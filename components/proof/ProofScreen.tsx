import { useState, type ReactNode } from 'react';
import { pathOf } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';
import { useMessages } from '../i18n/useMessages';
import { useToTop } from '../shell/useToTop';
import { Button, Notice, Screen } from '../ui';
import { Stopped } from '../stop/Stopped';
import { WithRecord } from '../worksheet/WithRecord';
import { Proved } from './Proved';
import { ProofFormScreen } from './ProofFormScreen';

function Elsewhere({ record, children }: { record: WorksheetRecord; children: ReactNode }) {
  const words = useMessages().proof;
  return (
    <Screen
      title={words.title}
      back={{
        label: words.back,
        href: { pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } },
      }}
    >
      {children}
    </Screen>
  );
}

/** Why there is nothing to record here, and where to go. */
function NotHere({ record }: { record: WorksheetRecord }) {
  const words = useMessages();
  const said = words.proof.notHere;
  const action = (
    <Button
      label={said.toWorksheet}
      href={{ pathname: '/worksheets/[worksheetId]', params: { worksheetId: record.id } }}
    />
  );
  if (pathOf(record.content) !== 'off') {
    return (
      <Notice title={said.energizedTitle} action={action}>
        {said.energizedBody}
      </Notice>
    );
  }
  if (record.state !== 'in-force') {
    return (
      <Notice title={said.stateTitle} action={action}>
        {said.stateBody(words.enumerations.state[record.state])}
      </Notice>
    );
  }
  return (
    <Notice title={said.leadTitle} action={action}>
      {said.leadBody(record.leadName)}
    </Notice>
  );
}

function ProofOf({ record }: { record: WorksheetRecord }) {
  const [again, setAgain] = useState(false);
  const last = record.proofs.at(-1);
  const isShownProved = record.proved && last !== undefined && !again;
  useToTop(`${record.state} ${isShownProved}`);
  if (record.state === 'stopped') {
    return (
      <Elsewhere record={record}>
        <Stopped record={record} />
      </Elsewhere>
    );
  }
  if (!record.actions.includes('prove')) {
    return (
      <Elsewhere record={record}>
        <NotHere record={record} />
      </Elsewhere>
    );
  }
  if (isShownProved) {
    return <Proved record={record} proof={last} onAgain={() => setAgain(true)} />;
  }
  return <ProofFormScreen record={record} onProved={() => setAgain(false)} />;
}

/** The test for absence of voltage of a worksheet in force, and its result. */
export function ProofScreen({ worksheetId }: { worksheetId: string }) {
  const words = useMessages().proof;
  return (
    <WithRecord worksheetId={worksheetId} loading={words.loading}>
      {(record) => <ProofOf key={`${record.id} ${record.revision}`} record={record} />}
    </WithRecord>
  );
}
