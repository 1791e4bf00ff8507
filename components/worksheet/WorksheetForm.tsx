import { useQueryClient } from '@tanstack/react-query';
import { useSetAtom } from 'jotai';
import { memo, useCallback, useDeferredValue, useEffect, useMemo, useRef, useState } from 'react';
import { FormProvider, useForm, useFormContext, useWatch, type FieldValues } from 'react-hook-form';
import { SECTIONS, sectionOf } from '@/shared/sections';
import type { WorksheetRecord } from '@/shared/record';
import type { WorksheetContent } from '@/shared/worksheet';
import { useUser } from '../api/session';
import type { KeptDraft } from '../drafts/draftTypes';
import { useDraft } from '../drafts/useDraft';
import { readContent } from './form/rawContent';
import { WorksheetFormProvider } from './form/WorksheetFormContext';
import { DraftConflict } from './parts/DraftConflict';
import { DraftState } from './parts/DraftState';
import { useSites } from './registerQueries';
import { useAssessment } from './useAssessment';
import { openSectionsAtom } from './worksheetAtoms';
import { WorksheetLayout } from './WorksheetLayout';
import { saveContent } from './worksheetQueries';

interface Props {
  record: WorksheetRecord;
  /** What was typed here and not sent yet, from an earlier visit. */
  kept: KeptDraft | null;
  /** The record is shown as last read: the server does not answer. */
  stale: boolean;
}

/** Opens the sections that still ask something, once, when the worksheet is opened. */
function useFirstOpen(record: WorksheetRecord) {
  const setOpen = useSetAtom(openSectionsAtom);
  useEffect(() => {
    const asked = new Set(
      record.assessment.findings
        .filter(({ severity }) => severity !== 'caution')
        .map((finding) => sectionOf(finding)),
    );
    setOpen((before) => ({
      ...Object.fromEntries(
        SECTIONS.map((section) => [
          `${record.id}/${section}`,
          // The distances are what the worksheet is for: never folded away by themselves.
          asked.has(section) || section === 'boundaries',
        ]),
      ),
      ...before,
    }));
    // Only when another worksheet or revision is opened: a section never folds while one types in it.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [record.id, record.revision]);
}

/**
 * The register wins over the client: what the server put in for a person or a
 * pair of gloves is shown as the server has it, without touching anything else
 * that was typed meanwhile.
 */
function registerFields(content: WorksheetContent): [string, unknown][] {
  const crew = (content.crew ?? []).flatMap((member, index): [string, unknown][] =>
    member.userId === undefined
      ? []
      : [
          [`crew.${index}.name`, member.name],
          [`crew.${index}.qualified`, member.qualified],
          [`crew.${index}.qualifiedThrough`, member.qualifiedThrough],
        ],
  );
  const equipment = content.protectiveEquipment;
  if (equipment?.rubberGoodsId === undefined) return crew;
  return [
    ...crew,
    ['protectiveEquipment.gloves.gloveClass', equipment.gloves?.gloveClass],
    ['protectiveEquipment.gloves.lastTestedOn', equipment.gloves?.lastTestedOn],
    ['protectiveEquipment.gloves.issuedOn', equipment.gloves?.issuedOn],
  ];
}

/** The worksheet as a form: every keystroke is assessed, kept on the device and sent. */
export function WorksheetForm(props: Props) {
  const { record, kept } = props;
  useFirstOpen(record);
  const form = useForm<FieldValues>({
    defaultValues: (kept?.raw ?? record.content) as FieldValues,
  });
  return (
    <FormProvider {...form}>
      <LiveForm {...props} />
    </FormProvider>
  );
}

const Layout = memo(WorksheetLayout);

/** Below the form's own context, so that a keystroke redraws this and not every field. */
function LiveForm({ record, kept, stale }: Props) {
  const user = useUser();
  const client = useQueryClient();
  const sites = useSites();
  const form = useFormContext<FieldValues>();
  const raw = useWatch({ control: form.control });
  // Keystrokes come first: the rules and the drawing follow as soon as the device has time.
  const settled = useDeferredValue(raw);
  const { content, faults } = useMemo(() => readContent(settled), [settled]);
  const site = sites.find(({ id }) => id === content.job?.siteId);
  const assessment = useAssessment(content, site?.timeZone ?? record.timeZone);

  const send = useCallback(
    (values: unknown, baseVersion: number) =>
      saveContent(client, record.id, readContent(values).content, baseVersion),
    [client, record.id],
  );
  const draft = useDraft({
    userId: user.id,
    worksheetId: record.id,
    version: kept?.baseVersion ?? record.version,
    send,
  });
  const { change, discard, rebase } = draft;

  const [restored, setRestored] = useState(kept !== null);
  useEffect(() => {
    if (kept !== null) change(kept.raw);
  }, [kept, change]);

  // Compared as text: the form hands out new objects at every render, also when nothing was typed.
  const seen = useRef(JSON.stringify(form.formState.defaultValues));
  useEffect(() => {
    const typed = JSON.stringify(raw);
    if (typed === seen.current) return;
    seen.current = typed;
    change(JSON.parse(typed));
  }, [raw, change]);

  useEffect(() => {
    for (const [name, value] of registerFields(record.content)) {
      if (form.getValues(name) !== value && form.getValues(userIdName(name)) !== undefined) {
        form.setValue(name, value);
      }
    }
  }, [form, record.content]);

  const { status } = draft;
  const saved = useMemo(
    () => <DraftState status={status} timeZone={record.timeZone} stale={stale} />,
    [status, record.timeZone, stale],
  );
  const notices = useMemo(() => {
    const handleTakeTheirs = async () => {
      await discard();
      rebase(record.version);
      form.reset(record.content);
    };
    const handleKeepMine = () => {
      rebase(record.version);
      change(structuredClone(form.getValues()));
    };
    return (
      <DraftConflict
        status={status}
        restored={restored}
        onSeen={() => setRestored(false)}
        onTakeTheirs={() => void handleTakeTheirs()}
        onKeepMine={handleKeepMine}
      />
    );
  }, [status, restored, record, form, discard, rebase, change]);
  return (
    <WorksheetFormProvider
      record={record}
      site={site}
      content={content}
      assessment={assessment}
      faults={faults}
      editable
    >
      <Layout saved={saved} beforeSections={notices} />
    </WorksheetFormProvider>
  );
}

/** The field that says whether a value comes from the register at all. */
function userIdName(name: string): string {
  return name.startsWith('crew.')
    ? name.replace(/\.[^.]+$/, '.userId')
    : 'protectiveEquipment.rubberGoodsId';
}
