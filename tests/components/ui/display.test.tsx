import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import { PreferencesProvider } from '@/components/i18n/preferences';
import {
  CautionPanel,
  Citation,
  FirstAidPanel,
  MARK_STATES,
  ProblemScreen,
  Screen,
  Section,
  StateMark,
  StopPanel,
  Table,
  Text,
  VerdictBar,
} from '@/components/ui';
import { ApiProblem } from '@/components/api/ApiProblem';

it('a mark is never without its word, in either language', () => {
  for (const locale of ['en-US', 'es-MX'] as const) {
    const { container, unmount } = render(
      <PreferencesProvider locale={locale} units="feet">
        {MARK_STATES.map((state) => (
          <StateMark key={state} state={state} />
        ))}
      </PreferencesProvider>,
    );
    expect(container.querySelectorAll('svg')).toHaveLength(MARK_STATES.length);
    const words = Array.from(container.querySelectorAll('[dir="auto"]')).map(
      (element) => element.textContent,
    );
    expect(words.filter((word) => word === '')).toEqual([]);
    expect(new Set(words).size).toBe(MARK_STATES.length);
    unmount();
  }
});

it('a section names its state and folds', async () => {
  const onToggle = vi.fn();
  const { rerender } = render(
    <Section
      id="s3"
      number={3}
      title="Ways it can be live"
      state="stop"
      detail="3 of 4"
      open={false}
      onToggle={onToggle}
      folded={null}
    >
      <Text>inside</Text>
    </Section>,
  );
  const head = screen.getByRole('button', { name: /Ways it can be live.*Stop/ });
  expect(head.getAttribute('aria-expanded')).toBe('false');
  expect(screen.queryByText('inside')).toBeNull();
  await userEvent.click(head);
  expect(onToggle).toHaveBeenCalledOnce();
  rerender(
    <Section id="s3" number={3} title="Ways it can be live" state="stop" open onToggle={onToggle}>
      <Text>inside</Text>
    </Section>,
  );
  expect(screen.getByRole('region', { name: /Ways it can be live/ }).textContent).toContain(
    'inside',
  );
});

it('panels are regions that begin with their signal word', () => {
  render(
    <>
      <StopPanel title="The battery unit in C6 is still connected." body="Part the connector." />
      <CautionPanel title="The exit lights are down." />
      <FirstAidPanel rows={[{ icon: 'phone', text: 'Call 911' }]} />
    </>,
  );
  expect(screen.getByRole('region', { name: /^Stop: The battery unit/ })).toBeTruthy();
  expect(screen.getByRole('region', { name: /^Caution: The exit lights/ })).toBeTruthy();
  expect(
    within(screen.getByRole('region', { name: 'First aid' })).getByRole('listitem').textContent,
  ).toBe('Call 911');
});

it.each([
  ['stop', 'assertive'],
  ['paper', 'polite'],
] as const)('the %s verdict is announced as %s', (tone, live) => {
  render(
    <VerdictBar tone={tone} mark={tone === 'stop' ? 'stop' : 'open'} detail="1 stop, 5 open" />,
  );
  expect(screen.getByRole('status').getAttribute('aria-live')).toBe(live);
});

it('a citation says in words how far it was checked', () => {
  const { container } = render(
    <Citation
      citation={{
        standard: 'NFPA 70E',
        edition: '2024',
        table: 'Table 130.4(E)(a)',
        confidence: 'memory',
      }}
    />,
  );
  expect(container.textContent).toBe('NFPA 70E-2024 Table 130.4(E)(a). From memory, to be checked');
});

it('every screen carries the caution', () => {
  render(<Screen title="Anything" />);
  expect(screen.getByRole('heading', { level: 1, name: 'Anything' })).toBeTruthy();
  expect(screen.getByRole('note').textContent).toContain('gives no permission to work');
  expect(document.title).toContain('Anything');
});

it('a problem of the server gives the number to read out', () => {
  const instance = 'urn:uuid:0190b5a4-0000-7000-8000-00000000ffff';
  render(
    <ProblemScreen
      error={new ApiProblem({ type: '/problems/unexpected', title: 'x', status: 500, instance })}
    />,
  );
  expect(screen.getByRole('alert').textContent).toContain('0190b5a4-0000-7000-8000-00000000ffff');
});

it('a table opens a row by the button in its first cell', async () => {
  const onOpen = vi.fn();
  render(
    <Table
      label="Worksheets"
      columns={[
        { key: 'number', label: 'No.', cell: (row: { id: string }) => row.id },
        {
          key: 'state',
          label: 'State',
          cell: () => 'Closed',
          onSort: () => undefined,
          sorted: 'descending',
        },
      ]}
      rows={[{ id: '2417' }, { id: '2388' }]}
      rowKey={(row) => row.id}
      onOpen={onOpen}
    />,
  );
  expect(screen.getAllByRole('row')).toHaveLength(3);
  expect(screen.getByRole('columnheader', { name: /State/ }).getAttribute('aria-sort')).toBe(
    'descending',
  );
  await userEvent.click(screen.getByRole('button', { name: '2388' }));
  expect(onOpen).toHaveBeenCalledWith({ id: '2388' });
  expect(onOpen).toHaveBeenCalledOnce();
});
