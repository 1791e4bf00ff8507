import { v7 as newId } from 'uuid';
import { z } from 'zod';
import { rubberGoodsTestInputSchema, type RubberGoods } from '@/shared/register';
import { useMessages } from '../i18n/useMessages';
import { Choice, DateField, Notice, TextField } from '../ui';
import { RegisterFormFrame } from './RegisterFormFrame';
import { useRegisterForm } from './useRegisterForm';

const formSchema = z.object({
  /** Names the test, so that sending it again after a lost answer adds no second one. */
  id: z.string(),
  testedOn: z.string().optional(),
  passed: z.boolean().optional(),
  laboratory: z.string(),
});
type Form = z.infer<typeof formSchema>;

const testOf = ({ laboratory, ...test }: Form) => ({
  ...test,
  ...(laboratory.trim() !== '' && { laboratory: laboratory.trim() }),
});

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
  const labels: Readonly<Record<string, string>> = {
    testedOn: words.testedOn,
    passed: words.result,
    laboratory: words.laboratory,
  };
  const form = useRegisterForm({
    subject: 'goods',
    recordId: item.id,
    part: 'tests',
    formSchema,
    initial: (): Form => ({ id: newId(), testedOn: undefined, passed: undefined, laboratory: '' }),
    toBody: testOf,
    bodySchema: rubberGoodsTestInputSchema,
    moreFaults: ({ testedOn }) =>
      testedOn !== undefined && testedOn > today ? [{ name: 'testedOn', code: 'after-today' }] : [],
    labelOf: (name) => labels[name] ?? name,
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
        id={idOf('testedOn')}
        label={words.testedOn}
        value={value.testedOn}
        max={today}
        onChange={(day) => set('testedOn', day)}
        error={errorOf('testedOn')}
      />
      <Choice<boolean>
        id={idOf('passed')}
        label={words.result}
        layout="row"
        options={[
          { value: true, label: words.passed },
          { value: false, label: words.failed },
        ]}
        value={value.passed}
        onChange={(passed) => set('passed', passed)}
        error={errorOf('passed')}
      />
      {value.passed === false && (
        <Notice live icon="refuse">
          {words.failedRetires}
        </Notice>
      )}
      <TextField
        id={idOf('laboratory')}
        label={words.laboratory}
        value={value.laboratory}
        onChangeText={(laboratory) => set('laboratory', laboratory)}
        error={errorOf('laboratory')}
        maxLength={200}
      />
    </RegisterFormFrame>
  );
}
