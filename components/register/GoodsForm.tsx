import { z } from 'zod';
import { GLOVE_CLASSES } from '@/hazard';
import {
  RUBBER_GOODS_KINDS,
  rubberGoodsInputSchema,
  type RubberGoods,
  type Site,
} from '@/shared/register';
import { useMessages } from '../i18n/useMessages';
import { DateField, Select, TextField } from '../ui';
import { RegisterFormFrame } from './RegisterFormFrame';
import { useRegisterForm } from './useRegisterForm';

const formSchema = z.object({
  siteId: z.string().optional(),
  kind: z.enum(RUBBER_GOODS_KINDS).optional(),
  gloveClass: z.enum(GLOVE_CLASSES).optional(),
  serial: z.string(),
  size: z.string(),
  issuedOn: z.string().optional(),
  testedOn: z.string().optional(),
  laboratory: z.string(),
});
type Form = z.infer<typeof formSchema>;

const changeSchema = rubberGoodsInputSchema.omit({ tests: true });

const startOf = (item: RubberGoods | undefined): Form => ({
  siteId: item?.siteId,
  kind: item?.kind,
  gloveClass: item?.gloveClass,
  serial: item?.serial ?? '',
  size: item?.size ?? '',
  issuedOn: item?.issuedOn ?? undefined,
  testedOn: undefined,
  laboratory: '',
});

function bodyOf({ testedOn, laboratory, ...form }: Form, item: RubberGoods | undefined) {
  const test = { testedOn, passed: true, ...(laboratory.trim() !== '' && { laboratory }) };
  return {
    ...form,
    serial: form.serial.trim(),
    size: form.size.trim(),
    issuedOn: form.issuedOn ?? null,
    // Tests are recorded one by one, never with what is printed on the item.
    ...(item === undefined && { tests: [test] }),
  };
}

interface Props {
  /** Undefined: an item is added, with the latest test that it passed. */
  item: RubberGoods | undefined;
  sites: readonly Site[];
  todayAt: (siteId: string | undefined) => string;
  onDone: (item: RubberGoods) => void;
  onCancel: () => void;
}

/** Adds an item of rubber goods, or changes what is printed on it and where it is. */
export function GoodsForm({ item, sites, todayAt, onDone, onCancel }: Props) {
  const { register, enumerations } = useMessages();
  const words = register.goods;
  const labels: Readonly<Record<string, string>> = {
    siteId: register.site,
    kind: register.kind,
    gloveClass: register.gloveClass,
    serial: words.serial,
    size: words.size,
    issuedOn: words.issuedOn,
    'tests.0.testedOn': words.firstTest,
    'tests.0.laboratory': words.laboratory,
  };
  const form = useRegisterForm({
    subject: 'goods',
    recordId: item?.id,
    formSchema,
    initial: () => startOf(item),
    toBody: (value) => bodyOf(value, item),
    bodySchema: item === undefined ? rubberGoodsInputSchema : changeSchema,
    moreFaults: ({ testedOn, siteId }) =>
      testedOn !== undefined && testedOn > todayAt(siteId)
        ? [{ name: 'tests.0.testedOn', code: 'after-today' }]
        : [],
    labelOf: (name) => labels[name] ?? name,
    wordFor: ({ name, code }) =>
      code === 'after-today'
        ? words.afterToday
        : name === 'serial' && code === 'taken'
          ? words.serialTaken
          : undefined,
  });
  if (form === undefined) return null;
  const { value, set, idOf, errorOf } = form;
  return (
    <RegisterFormFrame
      form={form}
      save={register.save}
      onSave={() => form.submit(onDone)}
      onCancel={onCancel}
    >
      <TextField
        id={idOf('serial')}
        label={words.serial}
        hint={words.serialHint}
        value={value.serial}
        onChangeText={(serial) => set('serial', serial)}
        error={errorOf('serial')}
        exact
        maxLength={200}
      />
      <Select
        id={idOf('kind')}
        label={register.kind}
        options={RUBBER_GOODS_KINDS.map((kind) => ({
          value: kind,
          label: enumerations.rubberGoodsKind[kind],
        }))}
        value={value.kind}
        onChange={(kind) => set('kind', kind)}
        error={errorOf('kind')}
      />
      <Select
        id={idOf('gloveClass')}
        label={register.gloveClass}
        options={GLOVE_CLASSES.map((gloveClass) => ({
          value: gloveClass,
          label: enumerations.gloveClass[gloveClass],
        }))}
        value={value.gloveClass}
        onChange={(gloveClass) => set('gloveClass', gloveClass)}
        error={errorOf('gloveClass')}
      />
      <Select
        id={idOf('siteId')}
        label={register.site}
        hint={words.siteHint}
        options={sites
          .filter(({ id, retired }) => !retired || id === value.siteId)
          .map(({ id, name }) => ({ value: id, label: name }))}
        value={value.siteId}
        onChange={(siteId) => set('siteId', siteId)}
        error={errorOf('siteId')}
      />
      <TextField
        id={idOf('size')}
        label={words.size}
        value={value.size}
        onChangeText={(size) => set('size', size)}
        error={errorOf('size')}
        exact
        maxLength={200}
      />
      {item === undefined && (
        <>
          <DateField
            id={idOf('tests.0.testedOn')}
            label={words.firstTest}
            value={value.testedOn}
            onChange={(date) => set('testedOn', date)}
            error={errorOf('tests.0.testedOn')}
          />
          <TextField
            id={idOf('tests.0.laboratory')}
            label={words.laboratory}
            value={value.laboratory}
            onChangeText={(laboratory) => set('laboratory', laboratory)}
            error={errorOf('tests.0.laboratory')}
            maxLength={200}
          />
        </>
      )}
      <DateField
        id={idOf('issuedOn')}
        label={words.issuedOn}
        hint={words.issuedHint}
        value={value.issuedOn}
        onChange={(date) => set('issuedOn', date)}
        error={errorOf('issuedOn')}
      />
    </RegisterFormFrame>
  );
}
