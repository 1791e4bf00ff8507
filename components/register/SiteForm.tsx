import { z } from 'zod';
import { SYSTEMS } from '@/hazard';
import { siteInputSchema, type Site } from '@/shared/register';
import type { Person } from '@/shared/user';
import { useMessages } from '../i18n/useMessages';
import { MultiChoice, Select, Text, TextField } from '../ui';
import { circuitsOf, PanelFields, panelFormSchema } from './PanelFields';
import { RegisterFormFrame } from './RegisterFormFrame';
import { useRegisterForm } from './useRegisterForm';
import { zoneWord } from './zoneWord';

const PLAN = ['contact', 'rescue', 'firstAid', 'aedAt'] as const;

const formSchema = z.object({
  name: z.string(),
  address: z.string(),
  timeZone: z.string().optional(),
  systems: z.array(z.enum(SYSTEMS)),
  panels: z.array(panelFormSchema),
  emergency: z.object({
    contact: z.string(),
    rescue: z.string(),
    firstAid: z.string(),
    aedAt: z.string(),
  }),
  deskToTell: z.string(),
  memberIds: z.array(z.string()),
});
type Form = z.infer<typeof formSchema>;

const startOf = (site: Site | undefined): Form => ({
  name: site?.name ?? '',
  address: site?.address ?? '',
  timeZone: site?.timeZone,
  systems: site?.systems ?? [],
  panels: (site?.panels ?? []).map(({ name, system, circuits = [] }) => ({
    name,
    system,
    circuits: circuits.join(', '),
  })),
  emergency: {
    contact: site?.emergency.contact ?? '',
    rescue: site?.emergency.rescue ?? '',
    firstAid: site?.emergency.firstAid ?? '',
    aedAt: site?.emergency.aedAt ?? '',
  },
  deskToTell: site?.deskToTell ?? '',
  memberIds: site?.memberIds ?? [],
});

/** What is not filled in is left out: an empty plan is no plan. */
const filled = (plan: Form['emergency']) =>
  Object.fromEntries(
    Object.entries(plan)
      .map(([key, value]) => [key, value.trim()] as const)
      .filter(([, value]) => value !== ''),
  );

const bodyOf = (form: Form) => ({
  ...form,
  name: form.name.trim(),
  address: form.address.trim(),
  deskToTell: form.deskToTell.trim(),
  emergency: filled(form.emergency),
  panels: form.panels.map(({ name, system, circuits }) => ({
    name: name.trim(),
    ...(system !== undefined && { system }),
    circuits: circuitsOf(circuits),
  })),
});

interface Props {
  /** Undefined: a site is added. */
  site: Site | undefined;
  people: readonly Person[];
  onDone: (site: Site) => void;
  onCancel: () => void;
}

function useLabels(): (name: string) => string {
  const words = useMessages().register.sites;
  const labels: Readonly<Record<string, string>> = {
    name: words.name,
    address: words.address,
    timeZone: words.timeZone,
    systems: words.systems,
    deskToTell: words.desk,
    memberIds: words.members,
    contact: words.contact,
    rescue: words.rescue,
    firstAid: words.firstAid,
    aedAt: words.aedAt,
    circuits: words.circuits,
  };
  return (name) => {
    const [, index, field] = /^panels\.(\d+)\.(\w+)/.exec(name) ?? [];
    if (index !== undefined && field !== undefined) {
      const panel = words.panel(Number(index) + 1);
      return field === 'name' ? panel : `${panel}, ${labels[field] ?? field}`;
    }
    return labels[name.split('.').at(-1) ?? ''] ?? name;
  };
}

/** Adds a site, or changes what the register says of one. */
export function SiteForm({ site, people, onDone, onCancel }: Props) {
  const { register, enumerations } = useMessages();
  const words = register.sites;
  const zones: Readonly<Record<string, string>> = words.zones;
  const form = useRegisterForm({
    subject: 'sites',
    recordId: site?.id,
    formSchema,
    initial: () => startOf(site),
    toBody: bodyOf,
    bodySchema: siteInputSchema,
    labelOf: useLabels(),
  });
  if (form === undefined) return null;
  const { value, set, idOf, errorOf } = form;
  const known = Object.keys(zones);
  const offeredZones =
    value.timeZone === undefined || known.includes(value.timeZone)
      ? known
      : [...known, value.timeZone];
  const members = people.filter(
    ({ id, retired }) => retired !== true || value.memberIds.includes(id),
  );
  return (
    <RegisterFormFrame
      form={form}
      save={register.save}
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
        id={idOf('address')}
        label={words.address}
        value={value.address}
        onChangeText={(address) => set('address', address)}
        error={errorOf('address')}
        maxLength={200}
      />
      <Select
        id={idOf('timeZone')}
        label={words.timeZone}
        hint={words.timeZoneHint}
        options={offeredZones.map((zone) => ({
          value: zone,
          label: zoneWord(zones, zone),
          note: zone,
        }))}
        value={value.timeZone}
        onChange={(timeZone) => set('timeZone', timeZone)}
        error={errorOf('timeZone')}
      />
      <MultiChoice
        id={idOf('systems')}
        label={words.systems}
        hint={words.systemsHint}
        layout="stack"
        options={SYSTEMS.map((system) => ({ value: system, label: enumerations.system[system] }))}
        value={value.systems}
        onChange={(systems) => set('systems', systems)}
        error={errorOf('systems')}
      />
      <PanelFields
        panels={value.panels}
        onChange={(panels) => set('panels', panels)}
        idOf={idOf}
        errorOf={errorOf}
      />
      <Text variant="strong">{words.emergency}</Text>
      {PLAN.map((field) => (
        <TextField
          key={field}
          id={idOf(`emergency.${field}`)}
          label={words[field]}
          value={value.emergency[field]}
          onChangeText={(text) => set('emergency', { ...value.emergency, [field]: text })}
          error={errorOf(`emergency.${field}`)}
          maxLength={200}
        />
      ))}
      <TextField
        id={idOf('deskToTell')}
        label={words.desk}
        hint={words.deskHint}
        value={value.deskToTell}
        onChangeText={(desk) => set('deskToTell', desk)}
        error={errorOf('deskToTell')}
        maxLength={200}
      />
      <MultiChoice
        id={idOf('memberIds')}
        label={words.members}
        hint={words.membersHint}
        layout="stack"
        options={members.map(({ id, name, role }) => ({
          value: id,
          label: name,
          note: enumerations.role[role],
        }))}
        value={value.memberIds}
        onChange={(memberIds) => set('memberIds', memberIds)}
        error={errorOf('memberIds')}
      />
    </RegisterFormFrame>
  );
}
