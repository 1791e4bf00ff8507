import { dateTimeText, list } from '@/shared/format';
import { closeOutFacts } from '@/shared/contentFacts';
import { useLocale, useUnits } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { Button, Facts, Text } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';
import { SectionFrame } from '../parts/SectionFrame';

/** What will have to be done, from the plan: locks off, emergency lights tested. */
function WhatComes() {
  const words = useMessages().worksheet;
  const locale = useLocale();
  const { content } = useWorksheetForm();
  const locks = [
    ...new Set(
      (content.sources ?? [])
        .map(({ lockNumber }) => lockNumber)
        .filter((lock) => lock !== undefined),
    ),
  ];
  const emergency = (content.egressSupply ?? []).some(
    (supply) => supply !== 'none after checking' && supply !== 'unknown',
  );
  return (
    <Text>
      {[
        words.closeOutRestore,
        locks.length > 0 ? words.closeOutLocks(list(locale, locks)) : undefined,
        emergency ? words.closeOutEgress : undefined,
      ]
        .filter(Boolean)
        .join(' ')}
    </Text>
  );
}

/** 12. The end of the job, once it was in force. */
export function CloseOutSection() {
  const words = useMessages().worksheet;
  const locale = useLocale();
  const units = useUnits();
  const { record } = useWorksheetForm();
  const { closeOut } = record;
  const inside =
    closeOut === null ? (
      <>
        <WhatComes />
        {record.actions.includes('close') && (
          <Button
            kind="primary"
            large
            icon="seal"
            label={words.closeOut}
            href={{
              pathname: '/worksheets/[worksheetId]/close',
              params: { worksheetId: record.id },
            }}
          />
        )}
      </>
    ) : (
      <>
        <Text variant="answer">
          {words.closedBy(closeOut.byName, dateTimeText(locale, closeOut.at, record.timeZone))}
        </Text>
        <Facts
          facts={closeOutFacts(closeOut.closeOut, { locale, units, timeZone: record.timeZone }).map(
            ({ label, value }) => ({ label, value }),
          )}
        />
      </>
    );
  return (
    <SectionFrame
      section="closeOut"
      state={closeOut === null ? 'waits' : 'complete'}
      detail={
        closeOut === null && !record.actions.includes('close') ? words.untilInForce : undefined
      }
      folded={inside}
      readOnly={inside}
    >
      {inside}
    </SectionFrame>
  );
}
