import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { renderWithProviders } from '../../testing/render-page';
import { Checkbox } from './checkbox';
import { ChoiceGroup } from './choice-group';
import { ErrorSummary } from './error-summary';
import { Field } from './field';
import { NumberField, type NumberReport } from './number-field';
import { TextInput } from './text-input';

describe('a field', () => {
  it('joins label, hint and fault with its control', () => {
    renderWithProviders(
      <Field id="email" label="E-mail address" hint="For the confirmation" error="Enter an e-mail address">
        {(control) => <TextInput {...control} />}
      </Field>,
    );
    const input = screen.getByRole('textbox', { name: 'E-mail address' });
    expect(input).toBeInvalid();
    expect(input).toHaveAccessibleDescription('For the confirmation Error: Enter an e-mail address');
  });

  it('says nothing of faults when there are none', () => {
    renderWithProviders(
      <Field id="name" label="Name" optional>
        {(control) => <TextInput {...control} />}
      </Field>,
    );
    const input = screen.getByRole('textbox', { name: 'Name (optional)' });
    expect(input).toBeValid();
    expect(input).not.toHaveAttribute('aria-describedby');
  });
});

type LengthUnit = 'mm' | 'in';
function Length({ report }: { report: (value: NumberReport<LengthUnit>) => void }) {
  const [state, setState] = useState<{ raw: string; unit: LengthUnit }>({ raw: '', unit: 'mm' });
  return (
    <NumberField
      id="length"
      label="Eye-to-eye"
      {...state}
      units={['mm', 'in']}
      onChange={(next) => {
        setState(next);
        report(next);
      }}
    />
  );
}

describe('a figure with its unit', () => {
  it('keeps what was typed and reports what it reads as', async () => {
    const report = vi.fn();
    renderWithProviders(<Length report={report} />);
    const input = screen.getByRole('textbox', { name: 'Eye-to-eye' });
    expect(input).toHaveAttribute('inputmode', 'decimal');
    await userEvent.type(input, '209,6');
    expect(input).toHaveValue('209,6');
    expect(report).toHaveBeenLastCalledWith({ raw: '209,6', unit: 'mm', value: 209.6 });
    await userEvent.type(input, 'x');
    expect(input).toHaveValue('209,6x');
    expect(report).toHaveBeenLastCalledWith({ raw: '209,6x', unit: 'mm', value: null });
  });

  it('takes another unit without touching the figure', async () => {
    const report = vi.fn();
    renderWithProviders(<Length report={report} />);
    await userEvent.type(screen.getByRole('textbox'), '8.5');
    const units = within(screen.getByRole('group', { name: 'Unit' }));
    expect(units.getByRole('radio', { name: 'mm' })).toBeChecked();
    await userEvent.click(units.getByRole('radio', { name: 'in' }));
    expect(report).toHaveBeenLastCalledWith({ raw: '8.5', unit: 'in', value: 8.5 });
    expect(screen.getByRole('textbox')).toHaveValue('8.5');
  });
});

function Tools() {
  const [value, setValue] = useState<'caliper' | 'ruler' | null>(null);
  return (
    <ChoiceGroup
      id="tool"
      name="tool"
      legend="Measured with"
      hint="Roughly is enough"
      error={value ? undefined : 'Choose one'}
      value={value}
      onChange={setValue}
      choices={[
        { value: 'caliper', label: 'Caliper', hint: 'To a tenth' },
        { value: 'ruler', label: 'Ruler' },
      ]}
    />
  );
}

describe('one of several', () => {
  it('is chosen by keyboard like any radio, its fault and hint said with the group', async () => {
    renderWithProviders(<Tools />);
    const group = screen.getByRole('group', { name: 'Measured with' });
    expect(group).toHaveAccessibleDescription('Roughly is enough Error: Choose one');
    await userEvent.tab();
    await userEvent.keyboard(' ');
    expect(screen.getByRole('radio', { name: /Caliper/ })).toBeChecked();
    await userEvent.keyboard('{ArrowDown}');
    expect(screen.getByRole('radio', { name: 'Ruler' })).toBeChecked();
    expect(group).toHaveAccessibleDescription('Roughly is enough');
  });
});

describe('a checkbox', () => {
  it('is a native one with its fault', async () => {
    renderWithProviders(<Checkbox id="ok" label="I have read it" error="Tick to go on" />);
    const box = screen.getByRole('checkbox', { name: 'I have read it' });
    expect(box).toHaveAccessibleDescription('Error: Tick to go on');
    await userEvent.click(screen.getByText('I have read it'));
    expect(box).toBeChecked();
  });
});

describe('the error summary', () => {
  const faults = [
    { fieldId: 'one', message: 'Enter the stroke' },
    { fieldId: 'tool', message: 'Choose a tool' },
  ];

  it('takes the focus at each attempt and leads to the fields', async () => {
    HTMLElement.prototype.scrollIntoView = () => undefined;
    const form = (attempt: number) => (
      <>
        <ErrorSummary faults={faults} attempt={attempt} />
        <Field id="one" label="Stroke">
          {(control) => <TextInput {...control} />}
        </Field>
      </>
    );
    renderWithProviders(form(1));
    const summary = screen.getByRole('alert', { name: '2 answers need another look' });
    expect(summary).toHaveFocus();
    await userEvent.click(screen.getByRole('link', { name: 'Enter the stroke' }));
    expect(screen.getByRole('textbox', { name: 'Stroke' })).toHaveFocus();
  });

  it('shows nothing while all is well', () => {
    renderWithProviders(<ErrorSummary faults={[]} attempt={0} />);
    expect(screen.queryByRole('alert')).not.toBeInTheDocument();
  });
});
