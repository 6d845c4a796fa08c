import { expect, type Locator, type Page } from '@playwright/test';

/** A card's name is its label and then its second line. */
const startingWith = (label: string) => new RegExp(`^${label.replaceAll(' ', '\\s')}(?!\\w)`);

/** What a person does on a step of the wizard, by what they read on it. */
export function wizardOn(page: Page) {
  const group = (label: string): Locator => page.getByRole('radiogroup', { name: label, exact: true });
  return {
    /** Picks one of the cards, or of the list that folds away beside the plan. */
    async pick(label: string, choice: string): Promise<void> {
      const list = page.getByRole('combobox', { name: label, exact: true });
      await expect(group(label).or(list)).toBeVisible();
      if (await list.isVisible()) await list.selectOption({ label: choice });
      else {
        await group(label).getByText(choice, { exact: true }).click();
        await expect(group(label).getByRole('radio', { name: startingWith(choice) })).toBeChecked();
      }
    },
    /** Ticks one of several. */
    async tick(label: string, choice: string): Promise<void> {
      const cards = page.getByRole('group', { name: label, exact: true });
      await cards.getByText(choice, { exact: true }).click();
      await expect(cards.getByRole('checkbox', { name: choice })).toBeChecked();
    },
    async type(label: string, number: string): Promise<void> {
      const box = page.getByRole('spinbutton', { name: label, exact: true });
      await box.fill(number);
      await box.press('Tab');
      // Nobody types faster than a button ignores a second tap for (400 ms).
      await page.waitForTimeout(500);
    },
    /** Turns a tile of the board on. */
    async turnOn(load: string): Promise<void> {
      const tile = page.getByRole('checkbox', { name: new RegExp(`^${load}\\.`) });
      await tile.tap();
      await expect(tile).toBeChecked();
    },
    /** The screen that is open, by its heading. */
    async see(title: string): Promise<void> {
      await expect(page.getByRole('heading', { level: 1, name: title, exact: true })).toBeVisible();
    },
    async next(label?: string): Promise<void> {
      await page.getByRole('button', { name: label ?? /^Next: |^See my price$/ }).click();
    },
  };
}
