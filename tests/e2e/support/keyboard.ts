import type { Locator, Page } from 'playwright-core';
import type { Stage } from './journey';
import { until } from './waiting';

type Role = Parameters<Page['getByRole']>[0];
type Name = string | RegExp;

/** What a stop of the Tab key looks like to whoever sees the page. */
type Stop = { what: string; seen: boolean; ring: boolean };

/** More stops than any page of ours asks for before what somebody came for. */
const MOST_STOPS = 60;

/** Somebody who has a keyboard and nothing else. Every stop has to be seen and to show that it has the focus. */
export class Keyboard {
  readonly #faults = new Set<string>();
  stops = 0;

  constructor(
    readonly page: Page,
    /** Where the person is, for the faults that are found there. */
    private readonly where: () => string = () => new URL(page.url()).pathname,
  ) {}

  get faults(): string[] {
    return [...this.#faults];
  }

  async press(key: string): Promise<void> {
    await this.page.keyboard.press(key);
  }

  /** Goes on until this has the focus. */
  async tabTo(role: Role, name: Name, { back = false, most = MOST_STOPS } = {}): Promise<void> {
    const wanted = this.named(role, name);
    const passed: string[] = [];
    for (let pressed = 0; pressed < most; pressed += 1) {
      await this.press(back ? 'Shift+Tab' : 'Tab');
      passed.push((await this.look()).what);
      if (await hasFocus(wanted)) return;
    }
    throw new Error(
      `${most} presses of Tab at ${this.where()} did not lead to the ${role} "${String(name)}"; they led to\n  ${passed.join('\n  ')}`,
    );
  }

  async tabAndPress(role: Role, name: Name, key = 'Enter'): Promise<void> {
    await this.tabTo(role, name);
    await this.press(key);
  }

  /** By the field's label: one for a password has no role. */
  async tabAndType(label: string, text: string): Promise<void> {
    await this.tabInto(this.page.getByLabel(label, { exact: true }), `the field "${label}"`);
    await this.page.keyboard.type(text);
  }

  /** Into a group of radio buttons by Tab, and along it with the arrows. */
  async tabAndChoose(group: Name, option: Name): Promise<void> {
    const radios = this.named('group', group).getByRole('radio');
    const wanted = this.named('group', group).getByRole('radio', exactly(option));
    await this.tabInto(radios, `the group "${String(group)}"`);
    if (await hasFocus(wanted)) return this.press('Space');
    const count = await radios.count();
    for (let pressed = 0; pressed < count; pressed += 1) {
      await this.press('ArrowRight');
      await this.look();
      if (await hasFocus(wanted)) return;
    }
    throw new Error(`The arrows did not lead to "${String(option)}" in the group "${String(group)}".`);
  }

  /** Opens a list, walks down to the option and takes it. */
  async tabAndPick(list: Name, option: string): Promise<void> {
    await this.tabAndPress('combobox', list);
    await this.page.getByRole('listbox').waitFor();
    const options = this.page.getByRole('option');
    const wanted = this.page.getByRole('option', { name: option, exact: true });
    await until(() => hasFocus(options));
    const count = await options.count();
    for (let pressed = 0; pressed <= count; pressed += 1) {
      await this.look();
      if (await hasFocus(wanted)) break;
      await this.press('ArrowDown');
    }
    if (!(await hasFocus(wanted))) throw new Error(`The arrows did not lead to "${option}" in "${String(list)}".`);
    await this.press('Enter');
    await this.page.getByRole('listbox').waitFor({ state: 'detached' });
    // What was opened gives the focus back to what opened it.
    if (!(await until(() => hasFocus(this.named('combobox', list)), { seconds: 5 })))
      this.#faults.add(`${this.where()}: the list "${String(list)}" does not give the focus back`);
  }

  async hasFocus(role: Role, name: Name, { seconds = 5 } = {}): Promise<boolean> {
    return until(() => hasFocus(this.named(role, name)), { seconds });
  }

  check(stage: Stage): void {
    stage.check('there were stops to look at', this.stops > 0);
    stage.none('every stop of the keyboard is seen and shows that it has the focus', this.faults);
  }

  private named(role: Role, name: Name): Locator {
    return this.page.getByRole(role, exactly(name));
  }

  private async tabInto(wanted: Locator, what: string): Promise<void> {
    for (let pressed = 0; pressed < MOST_STOPS; pressed += 1) {
      await this.press('Tab');
      await this.look();
      if (await hasFocus(wanted)) return;
    }
    throw new Error(`${MOST_STOPS} presses of Tab at ${this.where()} did not lead to ${what}.`);
  }

  /** Looks at the place where the focus is now. */
  private async look(): Promise<Stop> {
    const stop = await lookedAt(this.page);
    if (stop.what === nowhere) return stop;
    this.stops += 1;
    if (!stop.seen) this.#faults.add(`${this.where()}: ${stop.what} is not to be seen`);
    if (!stop.ring) this.#faults.add(`${this.where()}: ${stop.what} does not show that it has the focus`);
    return stop;
  }
}

const nowhere = 'the page itself';

const exactly = (name: Name) => (typeof name === 'string' ? { name, exact: true } : { name });

async function hasFocus(wanted: Locator): Promise<boolean> {
  return wanted.evaluateAll((found) => found.some((each) => each === document.activeElement));
}

/** Where the page comes to rest, it is measured: a drawing or a bar may still be on its way. */
async function lookedAt(page: Page): Promise<Stop> {
  let stop = await measured(page);
  await until(
    async () => {
      stop = await measured(page);
      return stop.seen && stop.ring;
    },
    { seconds: 0.6 },
  );
  return stop;
}

function measured(page: Page): Promise<Stop> {
  return page.evaluate((nobody) => {
    const focused = document.activeElement;
    if (focused === null || focused === document.body || focused === document.documentElement)
      return { what: nobody, seen: true, ring: true };
    const ringed = (element: Element) => {
      const { outlineStyle, outlineWidth, outlineColor } = getComputedStyle(element);
      return outlineStyle !== 'none' && Number.parseFloat(outlineWidth) >= 2 && !/, 0\)$/.test(outlineColor);
    };
    // A field or a radio button that is drawn by what stands round it or beside it shows its ring there.
    const round = [focused, focused.closest('label'), focused.parentElement, focused.nextElementSibling];
    const holder = round.find((element) => element !== null && ringed(element));
    // What the browser draws for the handle of a slider it does not tell: the rule that holds for it has to be found.
    const thumb = '::-webkit-slider-thumb';
    const ringsThumb = (rules: CSSRuleList): boolean =>
      [...rules].some((rule) => {
        if (!(rule instanceof CSSStyleRule)) return rule instanceof CSSGroupingRule && ringsThumb(rule.cssRules);
        const selector = rule.selectorText;
        if (!selector.endsWith(`:focus-visible${thumb}`)) return false;
        return focused.matches(selector.slice(0, -thumb.length)) && Number.parseFloat(rule.style.outlineWidth) >= 2;
      });
    const isRingedThumb = () =>
      focused.matches('input[type=range]') && [...document.styleSheets].some(({ cssRules }) => ringsThumb(cssRules));
    const isHighlighted = focused.getAttribute('role') === 'option' && focused.hasAttribute('data-highlighted');
    const drawn = holder ?? focused.closest('label') ?? focused;

    const box = drawn.getBoundingClientRect();
    const [left, right] = [Math.max(0, box.left), Math.min(innerWidth, box.right)];
    const [top, bottom] = [Math.max(0, box.top), Math.min(innerHeight, box.bottom)];
    const shares = [0.1, 0.3, 0.5, 0.7, 0.9];
    const points = shares.flatMap((x) =>
      shares.map((y) => [left + (right - left) * x, top + (bottom - top) * y] as const),
    );
    const uncovered = points.filter(([x, y]) => {
      const hit = document.elementFromPoint(x, y);
      return (
        hit !== null && (drawn.contains(hit) || hit.contains(drawn) || focused.parentElement?.contains(hit) === true)
      );
    });
    const seen =
      right - left >= 1 &&
      bottom - top >= 1 &&
      uncovered.length * 2 >= points.length &&
      drawn.checkVisibility({ visibilityProperty: true, opacityProperty: true });
    return {
      what: `${focused.tagName.toLowerCase()} "${(focused.getAttribute('aria-label') ?? drawn.textContent ?? '').trim().replace(/\s+/g, ' ').slice(0, 60)}" ${focused.id || focused.getAttribute('name') || ''}`.trim(),
      seen,
      ring: holder !== undefined || isHighlighted || isRingedThumb(),
    };
  }, nowhere);
}
