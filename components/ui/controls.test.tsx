import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Button } from './button';
import { Field } from './field';
import { Figure } from './figure';
import { NumberInput } from './number-input';
import { Table } from './table';
import { TextInput } from './text-input';
import { UnitsProvider } from './units';

afterEach(cleanup);

describe('a button that cannot be used', () => {
  it('does nothing, stays reachable and says why', () => {
    const press = vi.fn();
    render(
      <Button onClick={press} disabledReason="A driver may not publish a plan.">
        Publish
      </Button>,
    );
    const button = screen.getByRole('button', { name: 'Publish' });
    fireEvent.click(button);
    expect(press).not.toHaveBeenCalled();
    expect(button.hasAttribute('disabled')).toBe(false);
    expect(button.getAttribute('aria-disabled')).toBe('true');
    const reasonId = button.getAttribute('aria-describedby') ?? '';
    expect(document.getElementById(reasonId)?.textContent).toBe('A driver may not publish a plan.');
  });

  it('does not send its form', () => {
    const send = vi.fn((event: { preventDefault: () => void }) => event.preventDefault());
    render(
      <form onSubmit={send}>
        <Button type="submit" disabledReason="Not now.">
          Save
        </Button>
      </form>,
    );
    fireEvent.click(screen.getByRole('button'));
    expect(send).not.toHaveBeenCalled();
  });
});

describe('a field', () => {
  it('ties label, hint and error to its input', () => {
    render(
      <Field label="Hopper" hint="What fits in" error="It cannot be negative.">
        <TextInput name="hopper" />
      </Field>,
    );
    const input = screen.getByLabelText('Hopper');
    const described = (input.getAttribute('aria-describedby') ?? '')
      .split(' ')
      .map((id) => document.getElementById(id));
    expect(described.map((element) => element?.textContent)).toEqual(['What fits in', 'It cannot be negative.']);
    expect(input.getAttribute('aria-invalid')).toBe('true');
  });
});

describe('a number input', () => {
  const sent = () => document.querySelector<HTMLInputElement>('input[type=hidden]')?.value;
  const inUs = (defaultValue: number | null) =>
    render(
      <UnitsProvider system="us">
        <NumberInput name="tempC" quantity="temperature" defaultValue={defaultValue} aria-label="Limit" />
      </UnitsProvider>,
    );

  it('shows Fahrenheit to who reads Fahrenheit and sends Celsius', () => {
    inUs(-5);
    const input = screen.getByLabelText<HTMLInputElement>('Limit');
    expect(input.value).toBe('23');
    fireEvent.change(input, { target: { value: '14' } });
    expect(Number(sent())).toBeCloseTo(-10, 12);
  });

  it('sends a value that nobody touched exactly as it came', () => {
    inUs(-7.123456789);
    expect(sent()).toBe('-7.123456789');
  });

  it('sends what is no number as typed, for the check to name', () => {
    inUs(null);
    fireEvent.change(screen.getByLabelText('Limit'), { target: { value: 'cold' } });
    expect(sent()).toBe('cold');
  });
});

describe('a figure', () => {
  it('reads in the units of the person, with a true minus', () => {
    render(
      <UnitsProvider system="us">
        <Figure value={-20} quantity="temperature" />
      </UnitsProvider>,
    );
    expect(document.body.textContent).toBe('\u22124.0\u00A0°F');
  });

  it('says that there is none instead of showing a zero', () => {
    render(<Figure value={null} quantity="rate" none="no reading" />);
    expect(document.body.textContent).toBe('no reading');
  });
});

describe('a table', () => {
  it('has a name, and a head for every row and column', () => {
    render(
      <Table
        caption="Trucks"
        rows={[{ id: 4, hopper: '7.5' }]}
        rowKey={(row) => row.id}
        columns={[
          { key: 'id', head: 'Truck', isRowHead: true, cell: (row) => row.id },
          { key: 'hopper', head: 'Hopper', cell: (row) => row.hopper },
        ]}
      />,
    );
    expect(screen.getByRole('table', { name: 'Trucks' })).toBeTruthy();
    expect(screen.getAllByRole('columnheader').map((cell) => cell.textContent)).toEqual(['Truck', 'Hopper']);
    expect(screen.getByRole('rowheader').textContent).toBe('4');
  });
});
