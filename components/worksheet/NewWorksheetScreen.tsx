import { router } from 'expo-router';
import { useEffect, useRef, useState } from 'react';
import { v7 as newId } from 'uuid';
import { useUser } from '../api/session';
import { useMessages } from '../i18n/useMessages';
import { LoadingScreen, ProblemScreen } from '../ui';
import { useCreateWorksheet } from './worksheetQueries';

/**
 * Makes an empty worksheet with its lead on the crew and opens it. Nothing
 * else is filled in: no answer that bears on safety is ever given by the tool.
 */
export function NewWorksheetScreen() {
  const words = useMessages().worksheet;
  const user = useUser();
  const create = useCreateWorksheet();
  // The device chooses the id, so that a repeated request makes no second worksheet.
  const [id] = useState(() => newId());
  const started = useRef(false);
  const { mutate } = create;

  const start = () =>
    mutate(
      { id, content: { crew: [{ id: 'c1', userId: user.id, name: user.name, lead: true }] } },
      {
        onSuccess: (record) =>
          router.replace({
            pathname: '/worksheets/[worksheetId]',
            params: { worksheetId: record.id },
          }),
      },
    );
  useEffect(() => {
    if (started.current) return;
    started.current = true;
    start();
    // Once, when the screen opens; a second try is a person's press.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, []);

  if (create.isError) return <ProblemScreen error={create.error} onRetry={start} />;
  return <LoadingScreen label={words.loading} />;
}
