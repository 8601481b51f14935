import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ReactElement } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { renderToString } from 'react-dom/server';
import { afterEach, describe, expect, it } from 'vitest';
import { Bar, type BarProps } from '#src/components/bar.tsx';
import { DataTable } from '#src/components/data-table.tsx';
import { EntryRow } from '#src/components/entry-row.tsx';
import { FootTally } from '#src/components/foot-tally.tsx';
import { Kicker } from '#src/components/kicker.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { PhotoGroup } from '#src/components/photo-group.tsx';
import { Tape } from '#src/components/tape.tsx';

afterEach(cleanup);

const bar: BarProps = {
  links: [{ to: '/builds', label: 'Builds' }],
  person: { name: 'marlow', links: [{ to: '/settings', label: 'Settings' }], signOutAction: '/sign-out' },
  signInTo: '/sign-in',
  writeTo: '/write',
};
const bars = Array.from({ length: 12 }, (_, index) => ({
  day: `2026-03-${String(index + 2).padStart(2, '0')}`, amount: index * 100, label: `Entry ${index}`, href: `/builds/curlew/${index}`, current: index === 11,
}));
const pounds = (amount: number) => `£${(amount / 100).toFixed(2)}`;
const tape = <Tape title="Curlew, day by day" scale="money" from="2026-03-02" to="2026-03-13" bars={bars} show={pounds} />;
const picture = { id: 'a', width: 800, height: 600, alt: 'A rib', placeholder: 'data:image/png;base64,AA', sources: [{ type: 'image/avif', srcset: '/p/a-400.avif 400w' }], src: '/p/a-400.jpg' };

function at(address: string, page: ReactElement): ReactElement {
  return <MemoryRouter initialEntries={[address]}>{page}</MemoryRouter>;
}

describe('the bar', () => {
  it('marks the page one is on', () => {
    render(at('/builds/curlew', <Bar {...bar} />));
    const nav = within(screen.getByRole('navigation', { name: 'Site' }));
    expect(nav.getByRole('link', { name: 'Builds' }).getAttribute('aria-current')).toBe('page');
  });

  it('shows a person their menu, and a stranger the way in', () => {
    const { rerender } = render(at('/', <Bar {...bar} />));
    expect(screen.getAllByRole('button', { name: 'Sign out' }).map((button) => button.closest('form')?.getAttribute('action'))).toEqual(['/sign-out', '/sign-out']);
    expect(screen.queryByRole('link', { name: 'Sign in' })).toBeNull();
    rerender(at('/', <Bar links={bar.links} signInTo="/sign-in" person={null} />));
    expect(screen.getAllByRole('link', { name: 'Sign in' })).not.toHaveLength(0);
    expect(screen.queryByRole('link', { name: 'Write up a day' })).toBeNull();
    expect(screen.queryByRole('search')).toBeNull();
  });

  it('closes its menu on Escape and gives the focus back', async () => {
    const { container } = render(at('/', <Bar {...bar} />));
    const [menu] = container.querySelectorAll('details');
    const summary = menu?.querySelector('summary');
    if (!menu || !summary) throw new Error('The bar has no menu');
    await userEvent.click(summary);
    expect(menu.open).toBe(true);
    await userEvent.keyboard('{Escape}');
    expect(menu.open).toBe(false);
    expect(document.activeElement).toBe(summary);
    await userEvent.click(summary);
    await userEvent.click(document.body);
    expect(menu.open).toBe(false);
  });
});

describe('the tape', () => {
  it('names every bar, marks the current one and offers a way past', () => {
    render(at('/', tape));
    const region = within(screen.getByRole('region', { name: 'Curlew, day by day' }));
    expect(region.getAllByRole('link')).toHaveLength(12);
    expect(region.getByRole('link', { name: '13 Mar 2026, Entry 11, £11.00' }).getAttribute('aria-current')).toBe('true');
    const past = screen.getByRole('link', { name: 'Past the tape' });
    expect(document.getElementById(past.getAttribute('href')?.slice(1) ?? '')).not.toBeNull();
  });

  it('says its scale, and gives the same figures as a table', () => {
    const { container } = render(at('/', tape));
    expect(screen.getByText('Money used, a bar a day. The tallest is £11.00')).toBeTruthy();
    const rows = [...container.querySelectorAll('tbody tr')].map((row) => [...row.children].map((cell) => cell.textContent));
    expect(rows).toHaveLength(12);
    expect(rows[11]).toEqual(['13 Mar 2026', 'Entry 11', '£11.00']);
  });
});

describe('a table', () => {
  const columns = [
    { key: 'stage', label: 'Stage' },
    { key: 'used', label: 'Used', numeric: true, sort: { href: '?sort=used', direction: 'descending' as const } },
    { key: 'wasted', label: 'Wasted', numeric: true, sort: { href: '?sort=wasted', direction: null } },
    { key: 'days', label: 'Days', numeric: true },
  ];

  it('sorts by address and says how it is sorted', () => {
    render(at('/costs', <DataTable caption="By stage" columns={columns} rows={[{ key: 'ribs', cells: ['Ribs', '£102.44', '£3.40', 7] }]} foot={['Build', '£102.44', '£3.40', 7]} />));
    const table = within(screen.getByRole('table', { name: 'By stage' }));
    expect(table.getAllByRole('columnheader').map((head) => head.getAttribute('aria-sort'))).toEqual([null, 'descending', 'none', null]);
    expect(table.getByRole('link', { name: 'Wasted' }).getAttribute('href')).toBe('/costs?sort=wasted');
    expect(table.getAllByRole('rowheader').map((head) => head.textContent)).toEqual(['Ribs', 'Build']);
  });

  it('stacked on a phone still says what each figure is', () => {
    render(at('/', <DataTable caption="By stage" columns={columns} rows={[{ key: 'ribs', cells: ['Ribs', '£102.44', '£3.40', 7] }]} />));
    expect(screen.getByRole('table').dataset.phone).toBe('stack');
    expect(screen.getAllByRole('cell').map((cell) => cell.dataset.label)).toEqual(['Used', 'Wasted', 'Days']);
  });
});

it('a picture in a list leaves its words to the title beside it', () => {
  const { container } = render(at('/', <EntryRow to="/e" title="Seventeen ribs" picture={picture} kicker={{ items: ['14 Nov'] }} money={null} hours="7 h" />));
  expect(container.querySelector('img')?.alt).toBe('');
  expect(screen.getAllByRole('link')).toHaveLength(1);
  expect(container.textContent).not.toContain('£');
});

it('a group of photos gives each its alternative text, size and sources', () => {
  const { container } = render(<PhotoGroup first photos={['a', 'b', 'c'].map((id) => ({ picture: { ...picture, id }, caption: `Photo ${id}` }))} />);
  const pictures = screen.getAllByRole<HTMLImageElement>('img', { name: 'A rib' });
  expect(pictures.map((img) => [img.width, img.getAttribute('loading')])).toEqual([[800, 'eager'], [800, 'lazy'], [800, 'lazy']]);
  expect(container.querySelectorAll('source[type="image/avif"]')).toHaveLength(3);
  expect(screen.getAllByRole('figure').map((figure) => figure.textContent)).toEqual(['Photo a', 'Photo b', 'Photo c']);
});

it('a whole page drawn on the server comes alive in the browser without a word on the console', () => {
  const page = at('/builds/curlew', (
    <>
      <Bar {...bar} search={{ action: '/search' }} />
      <PageFrame head={<PageHead kicker={<Kicker lead={{ label: 'Curlew', to: '/builds/curlew' }} items={['Entry 31']} />} title="Seventeen ribs" />} hang={tape}>
        <PhotoGroup photos={[{ picture }]} />
        <FootTally label="The day's tally" figure="£91.74" words="this day" groups={[]} />
      </PageFrame>
    </>
  ));
  const box = document.createElement('div');
  box.innerHTML = renderToString(page);
  const before = box.innerHTML;
  document.body.append(box);
  render(page, { container: box, hydrate: true, onRecoverableError: (error) => console.error(error) });
  expect(box.innerHTML).toBe(before);
  expect(box.querySelectorAll('main, h1')).toHaveLength(2);
});
