import { useMessages } from '../../i18n/useMessages';
import { Notice } from '../../ui';
import { FieldMulti, FieldSelect } from './fields';
import { useWorksheetForm } from './WorksheetFormContext';

function useCrewNames() {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const crew = (content.crew ?? []).filter(({ id }) => id !== undefined);
  return {
    ids: crew.map(({ id }) => id ?? ''),
    nameOf: (id: string) =>
      crew.find((member) => member.id === id)?.name ?? words.worksheet.namelessMember,
    noteOf: (id: string) => {
      const member = crew.find((each) => each.id === id);
      return member?.qualified === true ? undefined : words.worksheet.notQualified;
    },
    words,
  };
}

/** One person of the crew, by the id that the worksheet gave them. */
export function FieldCrew({ name }: { name: string }) {
  const { ids, nameOf, noteOf, words } = useCrewNames();
  if (ids.length === 0) return <Notice icon="person">{words.worksheet.nameCrewFirst}</Notice>;
  return <FieldSelect name={name} values={ids} wordFor={nameOf} noteFor={noteOf} />;
}

/** Several people of the crew: whose locks hang on a device. */
export function FieldCrewList({ name }: { name: string }) {
  const { ids, nameOf } = useCrewNames();
  if (ids.length === 0) return null;
  return <FieldMulti name={name} values={ids} wordFor={nameOf} />;
}
