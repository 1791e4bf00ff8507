import { FormProvider, useForm, type FieldValues } from 'react-hook-form';
import type { WorksheetRecord } from '@/shared/record';
import { useMessages } from '../i18n/useMessages';
import { SavedState } from '../ui';
import { WorksheetFormProvider } from './form/WorksheetFormContext';
import { RecordNotices } from './parts/RecordNotices';
import { useSites } from './registerQueries';
import { WorksheetLayout } from './WorksheetLayout';

interface Props {
  record: WorksheetRecord;
  /** The record is shown as last read: the server does not answer. */
  stale: boolean;
}

const NO_FAULTS: never[] = [];

/** The worksheet as a record: what was answered, what the rules said at signing, who signed. */
export function WorksheetReadOnly({ record, stale }: Props) {
  const { worksheet: words } = useMessages();
  const sites = useSites();
  const form = useForm<FieldValues>({ values: record.content });
  return (
    <FormProvider {...form}>
      <WorksheetFormProvider
        record={record}
        site={sites.find(({ id }) => id === record.content.job?.siteId)}
        content={record.content}
        assessment={record.assessment}
        faults={NO_FAULTS}
        editable={false}
      >
        <WorksheetLayout
          saved={stale ? <SavedState icon="kept">{words.asLastRead}</SavedState> : undefined}
          beforeSections={<RecordNotices />}
        />
      </WorksheetFormProvider>
    </FormProvider>
  );
}
