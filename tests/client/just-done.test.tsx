import { act, cleanup, render, screen, waitFor } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, expect, test } from 'vitest';
import { JustDone } from '#src/components/just-done.tsx';

afterEach(cleanup);

function at(state: unknown) {
  render(<MemoryRouter initialEntries={[{ pathname: '/builds/curlew/eight-boards', state }]}><JustDone /></MemoryRouter>);
  return screen.getByRole('status');
}

test('what the desk just did is said on the page it led to', async () => {
  const status = at({ said: 'Signed off.' });
  expect(status.textContent).toBe('');
  await waitFor(() => expect(status.textContent).toBe('Signed off.'));
});

test('a page one comes to otherwise says nothing', async () => {
  for (const state of [null, 'Signed off.', { said: 3 }]) {
    const status = at(state);
    await act(() => new Promise((resolve) => { setTimeout(resolve, 5); }));
    expect(status.textContent).toBe('');
    cleanup();
  }
});
