import { fireEvent, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
// It follows the page in a browser.
import '@/components/help/how/live-example';
import { HowConstants } from '@/components/help/how/how-constants';
import { HowIndex } from '@/components/help/how/how-index';
import { HowPageBody } from '@/components/help/how/how-page-body';
import { HowUnknown } from '@/components/help/how/how-unknown';
import { constantGroups } from '@/lib/client/worked-out/constants';
import { howPages } from '@/lib/client/worked-out/how-page';
import how from '@/lib/messages/en/how.json';
import { renderWithWords } from '@/tests/support/with-words';

/** The example follows the page. */
async function open(page: React.ReactElement) {
  const shown = renderWithWords(page);
  await screen.findAllByRole('slider');
  return shown;
}

describe.each(howPages)('the page of %s', (page) => {
  it('has its equation, its words, an example and what it cannot promise', async () => {
    const { container } = await open(<HowPageBody page={page} />);
    const { title, what, how: way, sure } = how.page[page];
    expect(container.querySelector('h1')).toHaveTextContent(title);
    expect(container.querySelectorAll(`section[aria-label="${title}"] ol > li`).length).toBeGreaterThan(1);
    for (const words of [what, way, sure]) expect(screen.getByText(words)).toBeInTheDocument();
    expect(container.querySelectorAll('input[type="range"]').length).toBeGreaterThan(0);
    expect(screen.getByText('No dose can be read from this page.', { exact: false })).toBeInTheDocument();
  });
});

it('works the figures out again when a slider moves, and puts it back', async () => {
  await open(<HowPageBody page="volume" />);
  const results = screen.getByRole('status', { name: 'What follows' });
  // 9 x 4.5 m, 1.1 to 1.9 m deep: 60.75 m3.
  expect(results).toHaveTextContent('60.8 m³');
  fireEvent.change(screen.getByRole('slider', { name: 'Length' }), { target: { value: '12' } });
  expect(results).toHaveTextContent('81.0 m³');
  fireEvent.click(screen.getByRole('button', { name: 'Put back' }));
  expect(results).toHaveTextContent('60.8 m³');
});

it('shows the two published sets of constants side by side', async () => {
  await open(<HowPageBody page="chlorine-forms" />);
  expect(screen.getByRole('columnheader', { name: '1974 set, in use' })).toBeInTheDocument();
  expect(screen.getByRole('columnheader', { name: '2018 and 2019 set' })).toBeInTheDocument();
  expect(screen.getByText('Nobody has settled it', { exact: false })).toBeInTheDocument();
});

it('prints every constant with a source', () => {
  const { container } = renderWithWords(<HowConstants />);
  const listed = constantGroups.flatMap((group): readonly { of: string }[] => group.constants);
  expect(listed.length).toBeGreaterThan(200);
  for (const { of } of listed) {
    const row = container.querySelector(`[data-constant="${of}"]`);
    const [name, value, source] = [...(row?.children ?? [])].map((cell) => cell.textContent ?? '');
    expect(name, of).toMatch(/\S/);
    expect(value, of).toMatch(/\d/);
    expect(source, of).toMatch(/\w{4}/);
  }
});

it('leads to every page, and to what it cannot know', () => {
  renderWithWords(<HowIndex />);
  const addresses = screen.getAllByRole('link').map((link) => link.getAttribute('href'));
  expect(addresses).toEqual([...[...howPages, 'unknown', 'constants'].map((page) => `/help/how/${page}`)]);
});

it('says first what only people can see', () => {
  renderWithWords(<HowUnknown />);
  const [first] = screen.getAllByRole('heading', { level: 2 });
  expect(first).toHaveTextContent('Only you can see');
  expect(screen.getByText('If not, nobody goes in, whatever the sheet says.', { exact: false })).toBeInTheDocument();
});

it('says in the sentence of a drawing how its lines run', async () => {
  const { container } = await open(<HowPageBody page="tablets" />);
  expect(container.querySelector('figcaption')).toHaveTextContent(
    /^What is left of one tablet, day by day\. As drawn: .* from 100\.0\s?% at .* to 0\.0\s?% at /,
  );
});

it('says it anew when a slider moves', async () => {
  const { container } = await open(<HowPageBody page="free-chlorine" />);
  const sentence = () => container.querySelector('figcaption')?.textContent ?? '';
  const before = sentence();
  const [slider] = screen.getAllByRole<HTMLInputElement>('slider');
  fireEvent.change(slider!, { target: { value: slider!.min } });
  expect(sentence()).not.toBe(before);
});
