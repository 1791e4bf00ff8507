import { dayText, timeText } from '@/shared/format';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { TitleBlock } from '../../ui';
import { useWorksheetForm } from '../form/WorksheetFormContext';

/** The printed block: number and revision, state, lead, when the work ends. */
export function RecordTitle() {
  const words = useMessages();
  const locale = useLocale();
  const { record, content } = useWorksheetForm();
  const ends = content.job?.endsAt;
  const state = words.enumerations.state[record.state];
  return (
    <TitleBlock
      cells={[
        {
          label: words.common.worksheet,
          value: words.common.numbered(record.number, record.revision),
        },
        { label: words.worksheet.state, value: state },
        { label: words.enumerations.role.lead, value: record.leadName },
        {
          label: words.fields['job.endsAt'],
          value:
            ends === undefined
              ? words.ui.notAnswered
              : `${dayText(locale, ends, record.timeZone)} ${timeText(ends, record.timeZone)}`,
        },
      ]}
    />
  );
}
