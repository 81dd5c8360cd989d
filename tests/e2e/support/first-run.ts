import type { Locator, Page } from 'playwright-core';
import { words } from './words';

/** The row or segment of one choice; its radio button is drawn by the label around it. */
export const choice = (page: Page | Locator, text: string): Locator =>
  page.locator('label:has(input[type=radio])').filter({ hasText: text });

const tick = (page: Page, text: string): Locator =>
  page.locator('label:has(input[type=checkbox])').filter({ hasText: text });

export async function signUp(
  page: Page,
  { email, password, units = 'metric' }: { email: string; password: string; units?: 'metric' | 'us' },
): Promise<void> {
  await page.goto('/sign-up');
  await page.getByLabel(words('start.signUp.name'), { exact: true }).fill('Ines');
  await page.getByLabel(words('start.signUp.email'), { exact: true }).fill(email);
  await page.getByLabel(words('start.signUp.password'), { exact: true }).fill(password);
  await page.getByLabel(words('start.signUp.householdName'), { exact: true }).fill('Marrow Lane');
  await choice(page, words(`start.signUp.${units}Note`)).click();
  await page.getByRole('button', { name: words('start.signUp.submit') }).click();
  await page.waitForURL('**/first-run/scope');
}

/** Presses the one main button and waits for the step that follows. */
export async function goOn(page: Page, step: string, next: string): Promise<void> {
  await page.getByRole('button', { name: words(`pool.${step}.next`) }).click();
  await page.waitForURL(`**${next}`);
}

export async function answerScope(page: Page, system = 'chlorine'): Promise<void> {
  await choice(page, words(`pool.scope.system.${system}.detail`)).click();
  await choice(page, words('pool.scope.kind.pool')).first().click();
  await tick(page, words('pool.scope.chemicals.label')).click();
}

export async function answerSize(page: Page, volume: string): Promise<void> {
  await page.getByLabel(words('pool.size.volume'), { exact: true }).fill(volume);
  await choice(page, words('pool.size.sure.known')).click();
}

export async function answerLining(page: Page): Promise<void> {
  await choice(page, words('pool.lining.surface.plaster.detail')).click();
}

export async function answerSun(page: Page, place: { latitude: string; longitude: string }): Promise<void> {
  await page.getByLabel(words('pool.sun.place.latitude'), { exact: true }).fill(place.latitude);
  await page.getByLabel(words('pool.sun.place.longitude'), { exact: true }).fill(place.longitude);
  await choice(page, words('pool.sun.cover.none')).click();
}

export async function answerWater(page: Page): Promise<void> {
  await choice(page, words('pool.water.feeder.inline')).first().click();
  await pick(page, words('pool.water.feeder.ingredient'), words('pool.ingredient.trichlor.name'));
  await page.getByLabel(words('pool.water.feeder.capacity'), { exact: true }).fill('8');
  await tick(page, words('pool.water.methods.drop-kit')).click();
}

/** Chooses from a list that opens. */
export async function pick(page: Page, label: string, option: string): Promise<void> {
  await page.getByLabel(label, { exact: true }).click();
  await page.getByRole('option', { name: option, exact: true }).click();
}

export async function addProduct(
  page: Page,
  product: {
    substance: 'trichlor' | 'calcium-hypochlorite';
    form: 'tablet' | 'granular';
    strength: string;
    tabletMass?: string;
    stock: string;
    way: 'feeder-only' | 'dissolve';
  },
): Promise<void> {
  // The button moves down when the shelf is drawn.
  await page.waitForLoadState('networkidle');
  const first = page.getByRole('button', { name: words('pool.shelf.addFirst') });
  await first.or(page.getByRole('button', { name: words('pool.shelf.addAnother') })).click();
  const form = page.getByRole('region', { name: words('pool.product.title') });
  await pick(page, words('pool.product.ingredient'), words(`pool.ingredient.${product.substance}.name`));
  await choice(form, words(`pool.product.form.${product.form}`)).click();
  await form.getByLabel(words('pool.product.strength.available-chlorine'), { exact: true }).fill(product.strength);
  if (product.tabletMass !== undefined)
    await form.getByLabel(words('pool.product.amount.tabletMass'), { exact: true }).fill(product.tabletMass);
  await form.getByLabel(words('pool.product.amount.stock'), { exact: true }).fill(product.stock);
  await choice(form, words(`pool.product.way.${product.way}.label`)).click();
  await form.getByRole('button', { name: words('pool.product.keep') }).click();
  await form.waitFor({ state: 'detached' });
}

export async function answerLabel(page: Page): Promise<void> {
  await choice(page, words('pool.label.limit.at').replace('{limit}', '4')).click();
}

/** Types what the drop kit shows, in the fields' own order. */
export async function typeKit(page: Page, values: Partial<Record<string, string>>): Promise<void> {
  for (const [quantity, text] of Object.entries(values))
    if (text !== undefined) await page.locator(`#value-${quantity}`).fill(text);
}
