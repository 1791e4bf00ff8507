import { z } from 'zod';
import type { RubberGoods } from '@/shared/register';
import { date, text } from '@/shared/text';
import { useMessages } from '../i18n/useMessages';
import { Choice, DateField, Notice, TextField } from '../ui';
import { RegisterFormFrame } from './RegisterFormFrame';
import { useRegisterForm } from './useRegisterForm';

const formSchema = z.object({
  testedOn: z.string().optional(),
  passed: z.boolean().optional(),
  laboratory: z.string(),
});
type Form = z.infer<typeof formSchema>;

const testSchema = z.object({
  testedOn: date,
  passed: z.boolean(),
  laboratory: text().optional(),
});

const testOf = ({ testedOn, passed, laboratory }: Form) => ({
  testedOn,
  passed,
  ...(laboratory.trim() !== '' && { laboratory: laboratory.trim() }),
});

/** A failed test and the retirement are one change: there is no moment in which the item could still be chosen. */
function bodyOf(item: RubberGoods, form: Form) {
  return {
    tests: [...item.tests, testOf(form)],
    ...(form.passed === false && { retired: true, retiredBecause: 'failed test' }),
  };
}

interface Props {
  item: RubberGoods;
  /** Today at its site. */
  today: string;
  onDone: () => void;
  onCancel: () => void;
}

/** One more test of an item; one that failed takes it out of use. */
export function TestForm({ item, today, onDone, onCancel }: Props) {
  const { register } = useMessages();
  const words = register.goods;
  const last = `tests.${item.tests.length}`;
  const labels: Readonly<Record<string, string>> = {
    testedOn: words.testedOn,
    passed: words.result,
    laboratory: words.laboratory,
  };
  const form = useRegisterForm({
    subject: 'goods',
    recordId: item.id,
    form: `test-${item.tests.length}`,
    formSchema,
    initial: (): Form => ({ testedOn: undefined, passed: undefined, laboratory: '' }),
    toBody: (value) => bodyOf(item, value),
    bodySchema: z.looseObject({ tests: z.array(testSchema) }),
    moreFaults: ({ testedOn }) =>
      testedOn !== undefined && testedOn > today
        ? [{ name: `${last}.testedOn`, code: 'after-today' }]
        : [],
    labelOf: (name) => labels[name.split('.').at(-1) ?? ''] ?? name,
    wordFor: ({ code }) => (code === 'after-today' ? words.afterToday : undefined),
  });
  if (form === undefined) return null;
  const { value, set, idOf, errorOf } = form;
  return (
    <RegisterFormFrame
      form={form}
      save={value.passed === false ? words.saveFailed : words.saveTest}
      onSave={() => form.submit(onDone)}
      onCancel={onCancel}
    >
      <DateField
        id={idOf(`${last}.testedOn`)}
        label={words.testedOn}
        value={value.testedOn}
        max={today}
        onChange={(day) => set('testedOn', day)}
        error={errorOf(`${last}.testedOn`)}
      />
      <Choice<boolean>
        id={idOf(`${last}.passed`)}
        label={words.result}
        layout="row"
        options={[
          { value: true, label: words.passed },
          { value: false, label: words.failed },
        ]}
        value={value.passed}
        onChange={(passed) => set('passed', passed)}
        error={errorOf(`${last}.passed`)}
      />
      {value.passed === false && (
        <Notice live icon="refuse">
          {words.failedRetires}
        </Notice>
      )}
      <TextField
        id={idOf(`${last}.laboratory`)}
        label={words.laboratory}
        value={value.laboratory}
        onChangeText={(laboratory) => set('laboratory', laboratory)}
        error={errorOf(`${last}.laboratory`)}
        maxLength={200}
      />
    </RegisterFormFrame>
  );
}
