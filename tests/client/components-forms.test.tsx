import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { AmountField } from '#src/components/amount-field.tsx';
import { Checkbox } from '#src/components/checkbox.tsx';
import { Choice } from '#src/components/choice.tsx';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { fieldId } from '#src/components/field.tsx';
import { MoneyField } from '#src/components/money-field.tsx';
import { SelectField } from '#src/components/select-field.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { TextArea } from '#src/components/text-area.tsx';
import { TextField } from '#src/components/text-field.tsx';

afterEach(cleanup);

const wrong = 'Give an amount, for example 204.';

function described(control: HTMLElement): string {
  const ids = control.getAttribute('aria-describedby')?.split(' ') ?? [];
  return ids.map((id) => document.getElementById(id)?.textContent ?? `(nothing has the id ${id})`).join(' | ');
}

describe('a field', () => {
  it.each([
    ['text', <TextField key="x" name="x" label="Roves" hint="How many" error={wrong} />],
    ['text area', <TextArea key="x" name="x" label="Roves" hint="How many" error={wrong} />],
    ['select', <SelectField key="x" name="x" label="Roves" hint="How many" error={wrong} options={[{ value: '1', label: 'One' }]} />],
    ['money', <MoneyField key="x" name="x" label="Roves" hint="How many" error={wrong} sign="£" />],
    ['checkbox', <Checkbox key="x" name="x" label="Roves" hint="How many" error={wrong} />],
    ['amount', <AmountField key="x" name="x" label="Roves" hint="How many" error={wrong} amount={{}} unit={{}} unitName="unit" units={[{ value: 'piece', label: 'piece' }]} />],
  ])('of kind %s is labelled, and its hint and error belong to it', (_kind, field) => {
    render(field);
    const control = screen.getByLabelText('Roves', { selector: 'input, textarea, select' });
    expect(control.getAttribute('aria-invalid')).toBe('true');
    expect(described(control)).toBe(`How many | ${wrong}`);
  });

  it('without an error is not invalid and points at nothing', () => {
    render(<TextField name="x" label="Roves" optional />);
    const control = screen.getByLabelText('Roves (optional)');
    expect(control.hasAttribute('aria-invalid')).toBe(false);
    expect(control.hasAttribute('aria-describedby')).toBe(false);
  });

  it('keeps what was typed when it comes back with an error', async () => {
    const { rerender } = render(<MoneyField name="total" label="Total" sign="£" />);
    await userEvent.type(screen.getByLabelText('Total'), '1,5');
    rerender(<MoneyField name="total" label="Total" sign="£" error="Write 1.50 or 15." />);
    expect(screen.getByLabelText<HTMLInputElement>('Total').value).toBe('1,5');
  });

  it('of an amount labels its unit too', () => {
    render(<AmountField name="lines[0].amount" label="Roves" labelHidden amount={{}} unit={{ defaultValue: 'box' }} unitName="lines[0].unit" units={[{ value: 'piece', label: 'piece' }, { value: 'box', label: 'box of 500' }]} />);
    expect(screen.getByRole('textbox', { name: 'Roves, amount' }).id).toBe(fieldId('lines[0].amount'));
    expect(screen.getByRole<HTMLSelectElement>('combobox', { name: 'Roves, unit' }).value).toBe('box');
  });
});

describe('a choice', () => {
  const options = [{ value: 'public', label: 'Public' }, { value: 'private', label: 'Private', hint: 'you and your crew' }];

  it('is a named group with the default chosen', () => {
    render(<Choice name="visibility" label="Who may see it" options={options} defaultValue="public" error="Choose one." />);
    expect(described(screen.getByRole('group', { name: 'Who may see it' }))).toBe('Choose one.');
    expect(screen.getByRole<HTMLInputElement>('radio', { name: 'Public' }).checked).toBe(true);
  });

  it('tells its owner what was chosen', async () => {
    const chosen = vi.fn<(value: string) => void>();
    render(<Choice name="visibility" label="Who may see it" options={options} value="public" onChange={chosen} />);
    await userEvent.click(screen.getByRole('radio', { name: /Private/ }));
    expect(chosen).toHaveBeenCalledExactlyOnceWith('private');
  });
});

describe('the error summary', () => {
  const errors = [{ name: 'total', message: 'Write 1.50 or 15.' }];

  it('takes the focus, and leads to the field', async () => {
    render(
      <>
        <ErrorSummary errors={errors} />
        <MoneyField name="total" label="Total" sign="£" />
      </>,
    );
    expect(document.activeElement).toBe(screen.getByRole('alert'));
    const link = screen.getByRole('link', { name: 'Write 1.50 or 15.' });
    expect(link.getAttribute('href')).toBe(`#${screen.getByLabelText('Total').id}`);
  });

  it('takes it again with the next attempt, and not on every keystroke between', () => {
    const { rerender } = render(<ErrorSummary errors={errors} attempt={1} />);
    screen.getByRole('link').focus();
    rerender(<ErrorSummary errors={[...errors]} attempt={1} />);
    expect(document.activeElement).toBe(screen.getByRole('link'));
    rerender(<ErrorSummary errors={errors} attempt={2} />);
    expect(document.activeElement).toBe(screen.getByRole('alert'));
  });

  it('is not there when nothing is wrong', () => {
    const { container } = render(<ErrorSummary errors={[]} />);
    expect(container.innerHTML).toBe('');
  });
});

describe('the submit button', () => {
  it('while pending says so, keeps the focus and sends nothing twice', async () => {
    const sent = vi.fn<(event: { preventDefault: () => void }) => void>((event) => event.preventDefault());
    const form = (pending: boolean) => (
      <form onSubmit={sent}>
        <SubmitButton pending={pending} pendingWord="Signing off">Sign off</SubmitButton>
      </form>
    );
    const { rerender } = render(form(false));
    await userEvent.click(screen.getByRole('button', { name: 'Sign off' }));
    rerender(form(true));
    const button = screen.getByRole('button', { name: 'Signing off' });
    expect(document.activeElement).toBe(button);
    await userEvent.click(button);
    expect(sent).toHaveBeenCalledOnce();
  });
});
