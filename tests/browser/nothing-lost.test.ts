import type { BrowserContext, Page } from 'playwright-core';
import { expect, inject } from 'vitest';
import { amountOf, deskIsOpen, expectKept, expectWords, leadField, lineOf, putIn, signOff, tally, titleField, wordsField, PATIENCE } from './support/desk-hand.ts';
import { openDraft } from './support/draft.ts';
import { journey } from './support/journey.ts';
import { signIn } from './support/sign-in.ts';

async function openedDesk(context: BrowserContext, desk: string): Promise<Page> {
  const page = await context.newPage();
  await page.goto(desk);
  await deskIsOpen(page);
  return page;
}

journey('an entry saved over a newer one offers both texts, and keeps what is picked of each', async ({ open }) => {
  const { page: first, expectComplaint } = await open();
  expectComplaint(/status of 409/);
  await signIn(first, 'restorer');
  const desk = await openDraft(first, 'Two tabs');
  const second = await openedDesk(first.context(), desk);
  await titleField(second).fill('Written in the second tab');
  await wordsField(second).pressSequentially('The keel bolts came out whole.');
  await expectKept(second);
  await leadField(first).fill('Written in the first tab.');
  await titleField(first).fill('Another title from the first tab');
  const dialog = first.getByRole('dialog', { name: 'Somebody saved a newer text' });
  await expectWords(dialog, 'Another title from the first tab', 'Written in the second tab', 'Written in the first tab.', 'The keel bolts came out whole.');
  await dialog.getByRole('group', { name: 'Title' }).getByLabel('Theirs').check();
  await dialog.getByRole('button', { name: 'Go on with what is picked' }).click();
  await expectKept(first);
  const after = await openedDesk(first.context(), desk);
  expect(await titleField(after).inputValue()).toBe('Written in the second tab');
  expect(await leadField(after).inputValue()).toBe('Written in the first tab.');
  await expectWords(wordsField(after), 'The keel bolts came out whole.');
});

async function signOutElsewhere(context: BrowserContext): Promise<void> {
  const other = await context.newPage();
  await other.goto('/sign-out');
  await other.getByRole('main').getByRole('button', { name: 'Sign out' }).click();
  await other.waitForURL((url) => url.pathname === '/');
  await other.close();
}

async function signInThroughForm(page: Page, address: string): Promise<void> {
  await page.getByLabel('E-mail address').fill(address);
  await page.getByLabel('Password').fill(inject('demoSite').password);
  await page.getByRole('main').getByRole('button', { name: 'Sign in', exact: true }).click();
}

journey('a text typed while signed out waits for its own writer, and goes in once they are back', async ({ open }) => {
  const { page, expectComplaint } = await open();
  expectComplaint(/status of 401/);
  await signIn(page, 'restorer');
  const desk = await openDraft(page, 'Signed out');
  await titleField(page).fill('Before signing out');
  await expectKept(page);
  await signOutElsewhere(page.context());
  await titleField(page).fill('Typed after signing out');
  await expectWords(tally(page), 'Kept here; you are signed out, so the server does not have it yet');
  // Somebody else at the same browser finds nothing of it.
  await signIn(page, 'reader');
  expectComplaint(/status of 40[34]/);
  await page.goto(desk);
  expect(await page.getByRole('heading', { level: 1 }).innerText()).toMatch(/^(Not yours to do|Nothing at this address)$/);
  expect(await page.content()).not.toContain('Typed after signing out');
  await signOutElsewhere(page.context());
  await page.goto(desk);
  await page.waitForURL(/\/sign-in\?next=/);
  await signInThroughForm(page, 'restorer@demo.example');
  await page.waitForURL(`**${desk}`);
  await deskIsOpen(page);
  await expectWords(page.getByRole('status').filter({ hasText: 'taken up again' }), 'It was kept in this browser');
  expect(await titleField(page).inputValue()).toBe('Typed after signing out');
  await expectKept(page);
});

journey('the link beside a text that waits leads through the sign-in and back to it', async ({ open }) => {
  const { page, expectComplaint } = await open();
  expectComplaint(/status of 401/);
  await signIn(page, 'restorer');
  const desk = await openDraft(page, 'Sign in again');
  await signOutElsewhere(page.context());
  await titleField(page).fill('The title that waited');
  await tally(page).getByRole('link', { name: 'Sign in' }).click();
  await page.waitForURL(/\/sign-in\?next=/);
  await signInThroughForm(page, 'restorer@demo.example');
  await page.waitForURL(`**${desk}`);
  await deskIsOpen(page);
  await expectKept(page);
  expect(await titleField(page).inputValue()).toBe('The title that waited');
});

journey('a connection lost while typing loses nothing, even when the tab is closed before it is back', async ({ open }) => {
  const { page, expectComplaint } = await open();
  expectComplaint(/ERR_INTERNET_DISCONNECTED/);
  await signIn(page, 'restorer');
  const context = page.context();
  const desk = await openDraft(page, 'Out of reach');
  await context.setOffline(true);
  await titleField(page).fill('Typed without a connection');
  await wordsField(page).pressSequentially('The planer took two passes.');
  await expectWords(tally(page), 'Kept here; the server could not be reached, trying again');
  await context.setOffline(false);
  await expectKept(page);
  await context.setOffline(true);
  await titleField(page).fill('Typed before the tab was closed');
  await expectWords(tally(page), 'Kept here; the server could not be reached, trying again');
  await page.close();
  await context.setOffline(false);
  const again = await openedDesk(context, desk);
  await expectWords(again.getByRole('status').filter({ hasText: 'taken up again' }), 'It was kept in this browser');
  expect(await titleField(again).inputValue()).toBe('Typed before the tab was closed');
  await expectWords(wordsField(again), 'The planer took two passes.');
  await expectKept(again);
  await expect.poll(async () => (await openedDesk(context, desk)).getByRole('status').filter({ hasText: 'taken up again' }).count(), PATIENCE).toBe(0);
});

journey('a press on the blank of a block, then a letter, a paste or Backspace: the block stays as it was', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  const desk = await openDraft(page, 'Pressed beside');
  await wordsField(page).pressSequentially('Before it. ');
  const used = await putIn(page, 'Used');
  await amountOf(await lineOf(used, 0)).fill('3 pints');
  const pressBlank = () => used.getByRole('list').click({ position: { x: 2, y: 2 } });
  await pressBlank();
  await page.keyboard.press('Backspace');
  await page.keyboard.type('xyz');
  await pressBlank();
  await page.keyboard.press('Delete');
  await used.evaluate((block) => {
    const clipboardData = new DataTransfer();
    // the site's policy would complain of these styles if they were ever parsed
    clipboardData.setData('text/html', '<style>p { color: red }</style><p style="color: red">pasted</p>');
    block.dispatchEvent(new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }));
  });
  await expectKept(page);
  const after = await openedDesk(page.context(), desk);
  expect(await amountOf(after.getByRole('group', { name: 'Used', exact: true })).inputValue()).toBe('3 pints');
  await expectWords(wordsField(after), 'Before it.', 'xyz', 'pasted');
});

journey('a block taken out is back with Ctrl+Z', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  await openDraft(page, 'Taken out');
  const used = await putIn(page, 'Used');
  await amountOf(await lineOf(used, 0)).fill('3 pints');
  await used.getByRole('button', { name: 'Take out', exact: true }).click();
  await used.waitFor({ state: 'detached' });
  await page.keyboard.press('Control+z');
  await used.waitFor();
  expect(await amountOf(used).inputValue()).toBe('3 pints');
});

journey('a button under a field that turns out to be at fault still does what it says', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  await openDraft(page, 'Pressed at once');
  const cost = await putIn(page, 'Cost');
  await expect.poll(() => cost.getByRole('textbox', { name: 'What it was for' }).evaluate((field) => field === document.activeElement), PATIENCE).toBe(true);
  await putIn(page, 'Time');
  await cost.getByRole('textbox', { name: 'What it was for' }).click();
  await cost.getByRole('button', { name: 'Add a line' }).click();
  await expect.poll(() => cost.getByRole('listitem').count(), PATIENCE).toBe(2);
});

journey('signing off and taking back say that they are done', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  const desk = await openDraft(page, 'Said aloud');
  await titleField(page).fill('The keel bolts');
  await wordsField(page).pressSequentially('They came out whole.');
  const entry = await signOff(page);
  await expectWords(page.getByRole('main').getByRole('status'), 'Signed off.');
  await page.reload();
  await page.getByRole('heading', { level: 1, name: 'The keel bolts' }).waitFor();
  expect(await page.getByRole('main').getByRole('status').innerText()).toBe('');
  await page.goto(desk);
  await deskIsOpen(page);
  expect(await page.getByRole('button', { name: 'Throw the changes away' }).count()).toBe(0);
  await page.getByRole('button', { name: 'Take it back' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Take it back' }).click();
  await expectWords(page.getByRole('status').filter({ hasText: 'Taken back' }), 'Readers no longer see it');
  expect((await page.context().request.get(entry)).status()).toBe(404);
});

journey('without scripts the desk says what it needs and leads back, and nothing looks as if it were still coming', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  const desk = await openDraft(page, 'No scripts');
  const { page: plain } = await open({ scripts: false });
  await signIn(plain, 'restorer');
  await plain.goto(desk);
  const main = plain.getByRole('main');
  await expectWords(main, 'The desk needs scripts', 'what was written before is kept');
  expect(await main.getByRole('status').count()).toBe(0);
  await main.getByRole('link', { name: 'Back to the build' }).click();
  await plain.getByRole('heading', { level: 1, name: 'No scripts' }).waitFor();
});
