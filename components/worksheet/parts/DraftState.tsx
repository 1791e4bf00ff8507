import { timeText } from '@/shared/format';
import type { DraftStatus } from '../../drafts/useDraft';
import { useMessages } from '../../i18n/useMessages';
import { SavedState } from '../../ui';

interface Props {
  status: DraftStatus;
  timeZone: string;
  /** The server did not answer the last time it was asked. */
  stale: boolean;
}

/** How what was typed stands: on this device, on its way, with the server. */
export function DraftState({ status, timeZone, stale }: Props) {
  const { common, worksheet } = useMessages();
  const at = (instant: string | null) => (instant === null ? '' : timeText(instant, timeZone));
  switch (status.state) {
    case 'clean':
      return (
        <SavedState icon={stale ? 'kept' : 'sent'}>
          {stale ? worksheet.asLastRead : worksheet.saved}
        </SavedState>
      );
    case 'sent':
      return <SavedState icon="sent">{common.keeping.sent(at(status.sentAt))}</SavedState>;
    case 'sending':
      return <SavedState icon="clock">{common.keeping.sending}</SavedState>;
    case 'refused':
    case 'conflict':
      return <SavedState icon="kept">{common.keeping.refused}</SavedState>;
    case 'kept':
    case 'unreachable':
      return <SavedState icon="kept">{common.keeping.kept(at(status.keptAt))}</SavedState>;
  }
}
