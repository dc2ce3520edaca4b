import { beforeEach, describe, expect, it, jest } from '@jest/globals';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ReactElement } from 'react';
import { faultsOfAccess, show } from '../../app/testing';
import { discardDrafts } from '../../lib/drafts';
import { ApiProblem } from '../../lib/problem';
import { CheckInput, ChoiceInput, RadioInput } from './choice-fields';
import { Form } from './form';
import { MoneyInput, QuantityInput } from './number-fields';
import { fieldOfPointer } from './server-faults';
import { DayInput, PasswordInput, TextInput } from './text-fields';
import { useDraftForm } from './use-draft-form';

interface Values {
  code: string;
  quantity: string;
  cost: string;
  password: string;
}

function PartForm({ onSubmit }: { onSubmit: (values: Values) => Promise<unknown> }): ReactElement {
  const form = useDraftForm<Values>({
    name: 'part',
    defaultValues: { code: '', quantity: '', cost: '', password: '' },
    secret: ['password'],
  });
  return (
    <Form form={form} onSubmit={onSubmit} submitLabel="Add the part">
      <TextInput name="code" label="Code" longest={10} required />
      <QuantityInput name="quantity" label="Quantity" unit="m" places={3} required />
      <MoneyInput name="cost" label="Cost" currency="EUR" />
      <PasswordInput name="password" label="Password" autoComplete="current-password" />
    </Form>
  );
}

const draw = (onSubmit: (values: Values) => Promise<unknown>) =>
  show([{ path: '*', element: <PartForm onSubmit={onSubmit} /> }]);
const press = () => userEvent.click(screen.getByRole('button', { name: 'Add the part' }));
const field = (name: RegExp) => screen.getByRole('textbox', { name });

beforeEach(() => sessionStorage.clear());

describe('a form', () => {
  it('names what is missing in a summary that takes the focus, and beside each field', async () => {
    const onSubmit = jest.fn<() => Promise<void>>();
    const { container } = draw(onSubmit);
    await press();
    const summary = await screen.findByRole('alert');
    await waitFor(() => expect(summary).toHaveFocus());
    expect(
      within(summary)
        .getAllByRole('link')
        .map((link) => link.textContent),
    ).toEqual(['Code is needed.', 'Quantity is needed.']);
    expect(field(/^Code/)).toHaveAccessibleDescription('Code is needed.');
    expect(field(/^Code/)).toBeInvalid();
    expect(onSubmit).not.toHaveBeenCalled();
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.click(within(summary).getByRole('link', { name: 'Quantity is needed.' }));
    expect(field(/^Quantity/)).toHaveFocus();
  });

  it('sends decimal strings, however the decimal sign was typed', async () => {
    const onSubmit = jest.fn<(values: Values) => Promise<void>>().mockResolvedValue();
    draw(onSubmit);
    await userEvent.type(field(/^Code/), 'CU-WIRE-15');
    await userEvent.type(field(/^Quantity/), '1 284,5');
    await userEvent.type(field(/^Cost/), '0,41');
    await press();
    await waitFor(() => expect(onSubmit).toHaveBeenCalledTimes(1));
    expect(onSubmit.mock.calls[0]?.[0]).toEqual({ code: 'CU-WIRE-15', quantity: '1284.5', cost: '0.41', password: '' });
  });

  it('shows a number grouped once the field is left, and what is no number as it was typed', async () => {
    draw(jest.fn<() => Promise<void>>());
    await userEvent.type(field(/^Quantity/), '12845,5');
    await userEvent.tab();
    expect(field(/^Quantity/)).toHaveValue('12,845.5');
    await userEvent.clear(field(/^Quantity/));
    await userEvent.type(field(/^Quantity/), '12 boxes');
    await userEvent.tab();
    expect(field(/^Quantity/)).toHaveValue('12 boxes');
    expect(field(/^Quantity/)).toHaveAccessibleDescription('Quantity must be a number, such as 1.5 or 1,5.');
  });

  it.each([
    ['0', 'Quantity must be more than zero.'],
    ['-1', 'Quantity must not be below zero.'],
    ['1.2345', 'Quantity may have at most 3 decimal places.'],
  ])('refuses %s as a quantity', async (typed, sentence) => {
    draw(jest.fn<() => Promise<void>>());
    await userEvent.type(field(/^Quantity/), typed);
    await userEvent.tab();
    expect(await screen.findByText(sentence)).toBeVisible();
  });

  it('puts the server’s faults on their fields, and those of no field into the summary', async () => {
    const problem = new ApiProblem(409, {
      code: 'already_exists',
      detail: 'This could not be kept.',
      errors: [
        { pointer: '/code', code: 'already_exists', detail: 'There is a part with this code already.' },
        { pointer: '/bin', code: 'not_found', detail: 'The bin A-12 was taken away meanwhile.' },
      ],
    });
    draw(() => Promise.reject(problem));
    await userEvent.type(field(/^Code/), 'CLAMP-N2');
    await userEvent.type(field(/^Quantity/), '5');
    await press();
    const summary = await screen.findByRole('alert');
    expect(within(summary).getByText('The bin A-12 was taken away meanwhile.')).toBeVisible();
    expect(within(summary).getByRole('link', { name: 'There is a part with this code already.' })).toBeVisible();
    expect(field(/^Code/)).toHaveAccessibleDescription('There is a part with this code already.');
    expect(field(/^Code/)).toHaveValue('CLAMP-N2');
  });

  it('says what was refused as a whole, and can be sent again', async () => {
    const onSubmit = jest
      .fn<() => Promise<void>>()
      .mockRejectedValueOnce(new ApiProblem(422, { code: 'rule_broken', detail: 'The period is closed.', errors: [] }))
      .mockResolvedValueOnce();
    draw(onSubmit);
    await userEvent.type(field(/^Code/), 'A');
    await userEvent.type(field(/^Quantity/), '5');
    await press();
    expect(await screen.findByText('The period is closed.')).toBeVisible();
    await press();
    await waitFor(() => expect(screen.queryByRole('alert')).not.toBeInTheDocument());
    expect(onSubmit).toHaveBeenCalledTimes(2);
  });

  it('is sent once however often the button is pressed', async () => {
    let finish: () => void = () => undefined;
    const onSubmit = jest.fn(() => new Promise<void>((resolve) => (finish = resolve)));
    draw(onSubmit);
    await userEvent.type(field(/^Code/), 'A');
    await userEvent.type(field(/^Quantity/), '5');
    await userEvent.dblClick(screen.getByRole('button', { name: 'Add the part' }));
    expect(onSubmit).toHaveBeenCalledTimes(1);
    finish();
    await waitFor(() => expect(screen.getByRole('button', { name: 'Add the part' })).toBeEnabled());
  });
});

describe('what was typed', () => {
  it('is there again after a reload, without the password', async () => {
    const first = draw(jest.fn<() => Promise<void>>());
    await userEvent.type(field(/^Code/), 'CLAMP-N2');
    await userEvent.type(screen.getByLabelText(/^Password/), 'secret words');
    first.unmount();
    expect(JSON.stringify(sessionStorage)).not.toContain('secret words');
    draw(jest.fn<() => Promise<void>>());
    expect(field(/^Code/)).toHaveValue('CLAMP-N2');
    expect(screen.getByLabelText(/^Password/)).toHaveValue('');
    await userEvent.click(screen.getByRole('button', { name: 'Start afresh' }));
    expect(field(/^Code/)).toHaveValue('');
  });

  it('is still there after the server refused it and the page was loaded again', async () => {
    const first = draw(() =>
      Promise.reject(new ApiProblem(0, { code: 'unreachable', detail: 'No answer.', errors: [] })),
    );
    await userEvent.type(field(/^Code/), 'CLAMP-N2');
    await userEvent.type(field(/^Quantity/), '5');
    await press();
    await screen.findByText('No answer.');
    first.unmount();
    draw(jest.fn<() => Promise<void>>());
    expect(field(/^Code/)).toHaveValue('CLAMP-N2');
  });

  it('is forgotten once the server has it, and when somebody signs out', async () => {
    const first = draw(() => Promise.resolve());
    await userEvent.type(field(/^Code/), 'CLAMP-N2');
    await userEvent.type(field(/^Quantity/), '5');
    await press();
    await waitFor(() => expect(sessionStorage.getItem('draft:part')).toBeNull());
    await userEvent.type(field(/^Code/), 'X');
    expect(sessionStorage.getItem('draft:part')).not.toBeNull();
    discardDrafts();
    expect(sessionStorage.getItem('draft:part')).toBeNull();
    first.unmount();
  });
});

describe('the kinds of fields', () => {
  function Everything(): ReactElement {
    const form = useDraftForm({ name: 'all', defaultValues: { kind: '', role: 'b', sure: false, day: '', note: '' } });
    const choices = [
      { value: 'a', label: 'One way' },
      { value: 'b', label: 'Another way', hint: 'slower' },
    ];
    return (
      <Form form={form} onSubmit={() => Promise.resolve()} submitLabel="Keep">
        <ChoiceInput name="kind" label="Kind" choices={choices} required />
        <RadioInput name="role" label="Way" choices={choices} required />
        <CheckInput name="sure" label="I have read it" mustBeTicked="Read it first." />
        <DayInput name="day" label="Due" />
        <TextInput name="note" label="Note" rows={3} hint="For the bench." />
      </Form>
    );
  }

  it('all have names, hints and faults that a reader hears', async () => {
    const { container } = show([{ path: '*', element: <Everything /> }]);
    expect(screen.getByRole('combobox', { name: /^Kind/ })).toBeRequired();
    expect(screen.getByRole('radio', { name: /Another way/ })).toBeChecked();
    expect(screen.getByRole('textbox', { name: /^Note/ })).toHaveAccessibleDescription('For the bench.');
    expect(screen.getByLabelText(/^Due/)).toHaveAttribute('type', 'date');
    await userEvent.click(screen.getByRole('button', { name: 'Keep' }));
    expect(await screen.findByRole('checkbox', { name: 'I have read it' })).toHaveAccessibleDescription(
      'Read it first.',
    );
    expect(await faultsOfAccess(container)).toEqual([]);
  });
});

describe('a pointer of the server', () => {
  // RFC 6901 (JSON Pointer, 2013), section 4: ~1 is a slash, ~0 a tilde, in this order.
  it.each([
    ['/lines/0/quantity', 'lines.0.quantity'],
    ['/a~1b', 'a/b'],
    ['/m~0n', 'm~n'],
    ['/~01', '~1'],
    ['#/code', 'code'],
  ])('%s is the field %s', (pointer, name) => {
    expect(fieldOfPointer(pointer)).toBe(name);
  });
});
