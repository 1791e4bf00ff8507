import { z } from 'zod';
import type { Site } from '@/shared/register';
import { createUserSchema, LOCALES, ROLES, UNITS, type Person } from '@/shared/user';
import { useUser } from '../api/session';
import { useMessages } from '../i18n/useMessages';
import { Choice, DateField, MultiChoice, TextField } from '../ui';
import { RegisterFormFrame } from './RegisterFormFrame';
import { useRegisterForm } from './useRegisterForm';

const formSchema = z.object({
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES).optional(),
  siteIds: z.array(z.string()),
  qualifiedThrough: z.string().optional(),
  locale: z.enum(LOCALES),
  units: z.enum(UNITS),
});
type Form = z.infer<typeof formSchema>;

const startOf = (person: Person | undefined): Form => ({
  name: person?.name ?? '',
  email: person?.email ?? '',
  role: person?.role,
  siteIds: person?.siteIds ?? [],
  qualifiedThrough: person?.qualifiedThrough ?? undefined,
  locale: person?.locale ?? 'en-US',
  units: person?.units ?? 'feet',
});

const bodyOf = (form: Form) => ({
  ...form,
  name: form.name.trim(),
  email: form.email.trim(),
  qualifiedThrough: form.qualifiedThrough ?? null,
});

interface Props {
  /** Undefined: a person is invited. */
  person: Person | undefined;
  sites: readonly Site[];
  onDone: (person: Person) => void;
  onCancel: () => void;
}

/** Invites a person, or changes what the register says of one. */
export function PersonForm({ person, sites, onDone, onCancel }: Props) {
  const { register, enumerations, account } = useMessages();
  const me = useUser();
  const words = register.people;
  const form = useRegisterForm({
    subject: 'people',
    recordId: person?.id,
    formSchema,
    initial: () => startOf(person),
    toBody: bodyOf,
    bodySchema: createUserSchema,
    moreFaults: ({ role, siteIds }) =>
      role !== 'safety' && siteIds.length === 0 ? [{ name: 'siteIds', code: 'required' }] : [],
    labelOf: (name) =>
      ({ name: words.name, email: words.email, role: words.role, siteIds: words.sites })[name] ??
      words.qualified,
    wordFor: ({ name, code }) =>
      name === 'email' && code === 'taken'
        ? words.taken
        : name === 'email' && code !== 'required'
          ? register.csv.faults.email
          : undefined,
  });
  if (form === undefined) return null;
  const { value, set, idOf, errorOf } = form;
  const offered = sites.filter(({ id, retired }) => !retired || value.siteIds.includes(id));
  return (
    <RegisterFormFrame
      form={form}
      save={person === undefined ? words.invite : register.save}
      onSave={() => form.submit(onDone)}
      onCancel={onCancel}
    >
      <TextField
        id={idOf('name')}
        label={words.name}
        value={value.name}
        onChangeText={(name) => set('name', name)}
        error={errorOf('name')}
        exact
        autoCapitalize="words"
        maxLength={200}
      />
      <TextField
        id={idOf('email')}
        label={words.email}
        hint={words.emailHint}
        value={value.email}
        onChangeText={(email) => set('email', email)}
        error={errorOf('email')}
        exact
        inputMode="email"
        maxLength={320}
      />
      <Choice
        id={idOf('role')}
        label={words.role}
        layout="stack"
        options={ROLES.map((role) => ({
          value: role,
          label: enumerations.role[role],
          note: words.roleNote[role],
          reason: person?.id === me.id && role !== person.role ? words.ownRole : undefined,
        }))}
        value={value.role}
        onChange={(role) => set('role', role)}
        error={errorOf('role')}
      />
      <MultiChoice
        id={idOf('siteIds')}
        label={words.sites}
        hint={words.sitesHint}
        layout="stack"
        options={offered.map(({ id, name }) => ({ value: id, label: name }))}
        value={value.siteIds}
        onChange={(siteIds) => set('siteIds', siteIds)}
        error={errorOf('siteIds')}
      />
      <DateField
        id={idOf('qualifiedThrough')}
        label={words.qualified}
        hint={words.qualifiedHint}
        value={value.qualifiedThrough}
        onChange={(date) => set('qualifiedThrough', date)}
        error={errorOf('qualifiedThrough')}
      />
      <Choice
        id={idOf('locale')}
        label={words.language}
        layout="row"
        options={LOCALES.map((locale) => ({ value: locale, label: account.languages[locale] }))}
        value={value.locale}
        onChange={(locale) => set('locale', locale)}
      />
      <Choice
        id={idOf('units')}
        label={words.units}
        layout="row"
        options={UNITS.map((units) => ({ value: units, label: account.unitOptions[units] }))}
        value={value.units}
        onChange={(units) => set('units', units)}
      />
    </RegisterFormFrame>
  );
}
