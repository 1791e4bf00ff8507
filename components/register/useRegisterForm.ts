import { useState } from 'react';
import type { z } from 'zod';
import { ApiProblem } from '../api/ApiProblem';
import { useUser } from '../api/session';
import { useKeptForm } from '../drafts/useKeptForm';
import { useMessages } from '../i18n/useMessages';
import { describeFault, type FieldFault } from '../ui';
import { faultWord } from '../worksheet/form/fieldWords';
import { useSaveRecord, type RecordOf, type Subject } from './registerMutations';

interface NamedFault {
  /** Dotted name of the field: `panels.0.name`. */
  name: string;
  code: string;
}

interface Options<F extends object, S extends Subject> {
  subject: S;
  /** Undefined where a record is added. */
  recordId: string | undefined;
  /** Adds this part to the record, in a form of its own. */
  part?: 'tests';
  formSchema: z.ZodType<F>;
  initial: () => F;
  /** What is sent; its schema is the contract with the server. */
  toBody: (form: F) => Record<string, unknown>;
  bodySchema: z.ZodType;
  /** Faults that the schema does not know. */
  moreFaults?: (form: F) => NamedFault[];
  labelOf: (name: string) => string;
  /** Words of its own for a fault. */
  wordFor?: (fault: NamedFault) => string | undefined;
}

export interface RegisterForm<F extends object, R> {
  /** Names the fields on the page. */
  idOf: (name: string) => string;
  value: F;
  set: <K extends keyof F>(field: K, value: F[K]) => void;
  errorOf: (name: string) => string | undefined;
  faults: readonly FieldFault[];
  /** Sends it; `onDone` gets the record as the server has it. */
  submit: (onDone: (record: R) => void) => void;
  isPending: boolean;
  /** It was typed at an earlier visit and not saved. */
  wasKept: boolean;
  discard: () => void;
}

function codeOf(issue: z.core.$ZodIssue): string {
  if (issue.input === undefined || issue.input === '') return 'required';
  if (issue.code === 'custom' && typeof issue.params?.['code'] === 'string') {
    return issue.params['code'];
  }
  return issue.code;
}

function faultsOf(schema: z.ZodType, body: unknown): NamedFault[] {
  const parsed = schema.safeParse(body, { reportInput: true });
  if (parsed.success) return [];
  return parsed.error.issues.map((issue) => ({
    name: issue.path.map(String).join('.'),
    code: codeOf(issue),
  }));
}

const same = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other);

/** What the server did not take, as long as the field still holds what was sent. */
function serverFaults<F extends object>(error: unknown, sent: F | undefined, now: F): NamedFault[] {
  if (!(error instanceof ApiProblem) || sent === undefined) return [];
  return error.errors
    .map(({ pointer, code }) => ({ name: pointer.replace(/^#\//, '').replaceAll('/', '.'), code }))
    .filter(({ name }) => {
      const field = name.split('.')[0] as keyof F;
      return same(sent[field], now[field]);
    });
}

/** Only what changed is sent, so that the trail says what was changed. */
function changed(body: Record<string, unknown>, before: Record<string, unknown>) {
  return Object.fromEntries(
    Object.entries(body).filter(([key, value]) => !same(value, before[key])),
  );
}

/** A form of the register: kept on the device at every keystroke, checked by the contract, then by the server. */
export function useRegisterForm<F extends object, S extends Subject>(
  options: Options<F, S>,
): RegisterForm<F, RecordOf<S>> | undefined {
  const { subject, recordId, part, formSchema, initial, toBody, bodySchema } = options;
  const user = useUser();
  const messages = useMessages();
  const key = `register/${subject}/${recordId ?? 'new'}/${part ?? 'edit'}`;
  const kept = useKeptForm({ userId: user.id, key, schema: formSchema, initial });
  const save = useSaveRecord(subject, { id: recordId, part });
  const [sent, setSent] = useState<F>();
  const [wasKept, setWasKept] = useState<boolean>();
  const [before] = useState(() => toBody(initial()));
  if (kept === undefined) return undefined;
  if (wasKept === undefined) setWasKept(kept.keptAt !== null);

  const { value } = kept;
  const own = [...faultsOf(bodySchema, toBody(value)), ...(options.moreFaults?.(value) ?? [])];
  const named = sent === undefined ? [] : [...own, ...serverFaults(save.error, sent, value)];
  const words = (fault: NamedFault) => options.wordFor?.(fault) ?? faultWord(messages, fault.code);
  const idOf = (name: string) => `${subject}-${name.replaceAll('.', '-')}`;
  const first = named.filter(
    ({ name }, index) => named.findIndex((other) => other.name === name) === index,
  );
  const general =
    save.isError && serverFaults(save.error, sent, value).length === 0 && same(sent, value)
      ? [{ message: describeFault(save.error, messages) }]
      : [];

  return {
    idOf,
    value,
    set: (field, next) => kept.change((form) => ({ ...form, [field]: next })),
    errorOf: (name) => {
      const fault = first.find((each) => each.name === name);
      return fault && words(fault);
    },
    faults: [
      ...first.map((fault) => ({
        id: idOf(fault.name),
        message: messages.register.fieldFault(options.labelOf(fault.name), words(fault)),
      })),
      ...general,
    ],
    submit: (onDone) => {
      setSent(value);
      if (own.length > 0) return;
      const body = toBody(value);
      const isChange = recordId !== undefined && part === undefined;
      save.mutate(isChange ? changed(body, before) : body, {
        onSuccess: (record) => {
          void kept.clear();
          onDone(record);
        },
      });
    },
    isPending: save.isPending,
    wasKept: wasKept === true && kept.keptAt !== null,
    discard: () => {
      setSent(undefined);
      save.reset();
      void kept.clear();
    },
  };
}
