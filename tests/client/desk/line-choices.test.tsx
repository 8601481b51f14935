import { cleanup, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import { ChoicesButton, FoldingLine, LineChoices } from '#src/blocks/line-choices.tsx';

afterEach(cleanup);

test('the choices of a line say what is chosen, and open and close from there', async () => {
  const user = userEvent.setup();
  render(<ol><FoldingLine name="used1.lineA.line"><ChoicesButton of="Resin" words="Wasted, for each" above="2 l left" /><LineChoices><button type="button">Take out</button></LineChoices></FoldingLine></ol>);
  const button = screen.getByRole('button', { name: /^Wasted, for each: / });
  const choices = document.getElementById(button.getAttribute('aria-controls') ?? '');
  expect(choices?.textContent).toBe('Take out');
  expect(button.getAttribute('aria-expanded')).toBe('false');
  expect(choices?.className).toContain('max-wide:hidden');
  await user.click(button);
  expect(button.getAttribute('aria-expanded')).toBe('true');
  expect(choices?.className).not.toContain('max-wide:hidden');
});
