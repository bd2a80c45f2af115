import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { UnitsProvider } from '../units/units-context.tsx';
import { NumberField } from './NumberField.tsx';
import { UnitsSwitch } from './UnitsSwitch.tsx';

interface HarnessProps {
  readonly start?: number;
  readonly typed?: string;
  readonly onChange?: (value: number | undefined, typed: string) => void;
}

function Harness({ start, typed, onChange }: HarnessProps) {
  const [value, setValue] = useState(start);
  return (
    <UnitsProvider>
      <UnitsSwitch />
      <NumberField
        label="Bit diameter"
        quantity="length"
        value={value}
        typed={typed}
        onChange={(next, text) => {
          setValue(next);
          onChange?.(next, text);
        }}
      />
      <button type="button" onClick={() => setValue(12.7)}>
        Reset
      </button>
    </UnitsProvider>
  );
}

const field = () => screen.getByRole('textbox', { name: 'Bit diameter' });

describe('NumberField', () => {
  // 1 in = 25.4 mm exactly, so 1/4 in = 6.35 mm and 23/32 in = 18.25625 mm (C).
  it.each([
    ['1/4"', 6.35],
    ['6.35mm', 6.35],
    ['0.25 in', 6.35],
    ['23/32 in', 18.25625],
    ['3.175', 3.175],
  ])('reads %s and keeps it as typed', async (text, mm) => {
    const onChange = vi.fn();
    render(<Harness onChange={onChange} />);
    await userEvent.type(field(), text);
    const [value, typed] = onChange.mock.lastCall ?? [];
    expect(value).toBeCloseTo(mm, 10);
    expect(typed).toBe(text);
    expect(field()).toHaveValue(text);
  });

  it('says how a fraction was read', async () => {
    render(<Harness />);
    await userEvent.type(field(), '1/4"');
    expect(field()).toHaveAccessibleDescription('= 6.35 mm');
  });

  it('says what to change when it is left, and hands on that it cannot be read', async () => {
    const onChange = vi.fn();
    render(<Harness onChange={onChange} />);
    await userEvent.type(field(), 'abc');
    expect(field()).not.toBeInvalid();
    await userEvent.tab();
    expect(onChange.mock.lastCall?.[0]).toBeNaN();
    expect(field()).toBeInvalid();
  });

  it('hands on that it is empty', async () => {
    const onChange = vi.fn();
    render(<Harness start={6.35} onChange={onChange} />);
    await userEvent.clear(field());
    expect(onChange).toHaveBeenLastCalledWith(undefined, '');
  });

  it('rewrites a bare number when the units change, not a text that names its unit', async () => {
    render(<Harness start={6.35} />);
    expect(field()).toHaveValue('6.35');
    await userEvent.click(screen.getByRole('button', { name: 'in' }));
    expect(field()).toHaveValue('1/4');
    await userEvent.clear(field());
    await userEvent.type(field(), '8mm');
    await userEvent.click(screen.getByRole('button', { name: 'mm' }));
    expect(field()).toHaveValue('8mm');
  });

  it('shows the kept text beside a number, and follows a number that the form changes', async () => {
    render(<Harness start={18.25625} typed="23/32 in" />);
    expect(field()).toHaveValue('23/32 in');
    await userEvent.click(screen.getByRole('button', { name: 'Reset' }));
    expect(field()).toHaveValue('12.7');
  });
});
