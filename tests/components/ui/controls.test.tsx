import { fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import {
  Button,
  CheckRow,
  Choice,
  ErrorSummary,
  MultiChoice,
  NumberField,
  PinField,
  Select,
  TextField,
  YesNo,
} from '@/components/ui';

const options = [
  { value: 'fixed', label: 'Fixed' },
  { value: 'movable', label: 'Movable' },
] as const;

describe('Button', () => {
  it('acts when pressed', async () => {
    const onPress = vi.fn();
    render(<Button label="Sign as lead" onPress={onPress} />);
    await userEvent.click(screen.getByRole('button', { name: 'Sign as lead' }));
    expect(onPress).toHaveBeenCalledOnce();
  });

  it('says why it cannot be used, and does nothing', () => {
    const onPress = vi.fn();
    render(<Button label="Sign" onPress={onPress} reason="The PIN is missing" />);
    const button = screen.getByRole('button', { name: /Sign.*The PIN is missing/ });
    fireEvent.click(button);
    expect(onPress).not.toHaveBeenCalled();
  });

  it('is a link where it leads on', () => {
    render(<Button label="Archive" href="/archive" />);
    expect(screen.getByRole('link', { name: 'Archive' }).getAttribute('href')).toBe('/archive');
  });
});

describe('Choice', () => {
  function Asked({ onChange }: { onChange: (value: string) => void }) {
    const [value, setValue] = useState<'fixed' | 'movable' | undefined>(undefined);
    return (
      <Choice
        label="Can a conductor swing?"
        options={options}
        value={value}
        onChange={(next) => {
          setValue(next);
          onChange(next);
        }}
      />
    );
  }

  it('is a radio group named by its question, with nothing chosen at first', () => {
    render(<Asked onChange={() => undefined} />);
    expect(screen.getByRole('radiogroup', { name: 'Can a conductor swing?' })).toBeTruthy();
    for (const radio of screen.getAllByRole('radio'))
      expect(radio.getAttribute('aria-checked')).toBe('false');
  });

  it('is chosen by the arrow keys', async () => {
    const onChange = vi.fn();
    render(<Asked onChange={onChange} />);
    await userEvent.tab();
    expect(document.activeElement).toBe(screen.getByRole('radio', { name: 'Fixed' }));
    await userEvent.keyboard('{ArrowDown}');
    expect(onChange).toHaveBeenLastCalledWith('movable');
    expect(screen.getByRole('radio', { name: 'Movable' }).getAttribute('aria-checked')).toBe(
      'true',
    );
  });

  it('does not take an answer that cannot be given now', () => {
    const onChange = vi.fn();
    render(
      <Choice
        label="Way"
        value={undefined}
        onChange={onChange}
        options={[{ value: 'a', label: 'Breaker', reason: 'Lock it first' }]}
      />,
    );
    fireEvent.click(screen.getByRole('radio', { name: /Breaker/ }));
    expect(onChange).not.toHaveBeenCalled();
  });
});

it('MultiChoice adds and takes away answers', async () => {
  const onChange = vi.fn();
  render(<MultiChoice label="Fed by" options={options} value={['fixed']} onChange={onChange} />);
  await userEvent.click(screen.getByRole('checkbox', { name: 'Movable' }));
  expect(onChange).toHaveBeenLastCalledWith(['fixed', 'movable']);
  await userEvent.click(screen.getByRole('checkbox', { name: 'Fixed' }));
  expect(onChange).toHaveBeenLastCalledWith([]);
});

it('YesNo tells no from not answered', () => {
  const { rerender } = render(<YesNo label="Wet?" value={undefined} onChange={() => undefined} />);
  expect(screen.queryByRole('radio', { checked: true })).toBeNull();
  rerender(<YesNo label="Wet?" value={false} onChange={() => undefined} />);
  expect(screen.getByRole('radio', { checked: true }).textContent).toBe('No');
});

it('Select unfolds in its place and closes on an answer', async () => {
  const onChange = vi.fn();
  render(<Select label="Equipment" options={options} value={undefined} onChange={onChange} />);
  expect(screen.queryByRole('radio')).toBeNull();
  await userEvent.click(screen.getByRole('button', { name: /Equipment/ }));
  await userEvent.click(screen.getByRole('radio', { name: 'Movable' }));
  expect(onChange).toHaveBeenCalledWith('movable');
  expect(screen.queryByRole('radio')).toBeNull();
});

it('CheckRow is a check box described by its note', async () => {
  const onChange = vi.fn();
  render(<CheckRow label="Air tested" note="Today" checked={false} onChange={onChange} />);
  const box = screen.getByRole('checkbox', { name: 'Air tested' });
  const note = box.getAttribute('aria-describedby');
  expect(note && document.getElementById(note)?.textContent).toBe('Today');
  await userEvent.click(box);
  expect(onChange).toHaveBeenCalledWith(true);
});

describe('TextField', () => {
  it('is named by its label and described by hint and error', () => {
    render(
      <TextField
        label="Panel"
        hint="As on the door"
        error="Name the panel."
        value=""
        onChangeText={() => undefined}
      />,
    );
    const field = screen.getByRole('textbox', { name: 'Panel' });
    expect(field.getAttribute('aria-invalid')).toBe('true');
    const described = (field.getAttribute('aria-describedby') ?? '').split(' ');
    expect(described.map((id) => document.getElementById(id)?.textContent)).toEqual([
      'As on the door',
      'Name the panel.',
    ]);
  });

  it('shows a password when asked', async () => {
    render(<TextField label="Password" secure value="secret" onChangeText={() => undefined} />);
    const field = document.querySelector('input');
    expect(field?.type).toBe('password');
    await userEvent.click(screen.getByRole('button', { name: 'Show' }));
    expect(field?.type).not.toBe('password');
  });
});

describe('NumberField', () => {
  function Asked({ onChange }: { onChange: (value: number | undefined) => void }) {
    const [value, setValue] = useState<number | undefined>(undefined);
    return (
      <NumberField
        label="Rated for"
        unit="V"
        min={1}
        value={value}
        onChange={(next) => {
          setValue(next);
          onChange(next);
        }}
      />
    );
  }

  it.each([
    ['1000', 1000],
    ['1,000', 1000],
    ['2.5', 2.5],
    ['2,5', undefined],
    ['12 kV', undefined],
    ['0', undefined],
  ])('reads %s as %s', async (typed, expected) => {
    const onChange = vi.fn();
    render(<Asked onChange={onChange} />);
    const field = screen.getByRole('textbox', { name: 'Rated for' });
    await userEvent.type(field, typed);
    expect(onChange).toHaveBeenLastCalledWith(expected);
    expect((field as HTMLInputElement).value).toBe(typed);
    expect(field.getAttribute('aria-invalid')).toBe(expected === undefined ? 'true' : null);
  });

  it('never keeps the old figure when it is overwritten by text', async () => {
    const onChange = vi.fn();
    render(<Asked onChange={onChange} />);
    const field = screen.getByRole('textbox', { name: 'Rated for' });
    await userEvent.type(field, '60');
    await userEvent.type(field, 'x');
    expect(onChange).toHaveBeenLastCalledWith(undefined);
  });

  it('takes a figure that is set from outside', () => {
    const { rerender } = render(
      <NumberField label="Watts" value={undefined} onChange={() => undefined} />,
    );
    rerender(<NumberField label="Watts" value={728} onChange={() => undefined} />);
    expect(screen.getByRole<HTMLInputElement>('textbox', { name: 'Watts' }).value).toBe('728');
  });
});

it('PinField takes six digits and shows none of them', async () => {
  function Asked() {
    const [pin, setPin] = useState('');
    return <PinField value={pin} onChange={setPin} />;
  }
  const { container } = render(<Asked />);
  const field = screen.getByRole('textbox', { name: /PIN/ });
  await userEvent.type(field, '12a345678');
  expect((field as HTMLInputElement).value).toBe('123456');
  expect(container.textContent).not.toMatch(/\d{2}/);
});

it('ErrorSummary takes the focus and leads to the field', async () => {
  render(
    <>
      <ErrorSummary faults={[{ id: 'panel', message: 'Name the panel.' }]} />
      <TextField id="panel" label="Panel" value="" onChangeText={() => undefined} />
    </>,
  );
  expect(document.activeElement).toBe(screen.getByRole('alert'));
  await userEvent.click(screen.getByRole('link', { name: 'Name the panel.' }));
  expect(document.activeElement).toBe(screen.getByRole('textbox', { name: 'Panel' }));
});
