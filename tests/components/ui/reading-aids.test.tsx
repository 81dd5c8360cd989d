import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it } from 'vitest';
import { Callout } from '@/components/ui/callout';
import { Disclosure } from '@/components/ui/disclosure';
import { PictureOrTable } from '@/components/ui/picture-or-table';
import { ProgressRuler } from '@/components/ui/progress-ruler';
import { Tabs } from '@/components/ui/tabs';
import { VerdictFrame, type VerdictFrameState } from '@/components/ui/verdict-frame';

it('shows the same figures as a table, one press away and back', async () => {
  render(
    <PictureOrTable
      sentence="Free chlorine stays between 2.5 and 3.9 mg/L."
      picture={<svg data-testid="curve" />}
      table={{ columns: ['Day', 'Low', 'High'], rows: [['Monday', '2.6', '3.7']] }}
      seeTable="See as a table"
      seePicture="See as a picture"
    />,
  );
  expect(screen.getByRole('figure', { name: 'Free chlorine stays between 2.5 and 3.9 mg/L.' })).toBeInTheDocument();
  await userEvent.click(screen.getByRole('button', { name: 'See as a table' }));
  const row = within(screen.getByRole('table')).getByRole('row', { name: 'Monday 2.6 3.7' });
  expect(within(row).getByRole('rowheader')).toHaveTextContent('Monday');
  expect(screen.queryByTestId('curve')).not.toBeInTheDocument();
  await userEvent.click(screen.getByRole('button', { name: 'See as a picture' }));
  expect(screen.getByTestId('curve')).toBeInTheDocument();
});

it('opens a row and shuts it', async () => {
  render(
    <Disclosure summary="Thursday">
      <p>Quick check by 19:00</p>
    </Disclosure>,
  );
  const row = screen.getByText('Thursday');
  expect(screen.getByText('Quick check by 19:00')).not.toBeVisible();
  await userEvent.click(row);
  expect(screen.getByText('Quick check by 19:00')).toBeVisible();
  await userEvent.click(row);
  expect(screen.getByText('Quick check by 19:00')).not.toBeVisible();
});

it('goes from tab to tab by arrow key', async () => {
  render(
    <Tabs
      label="How it was tested"
      defaultValue="strip"
      tabs={[
        { value: 'strip', label: 'Strip', panel: 'pads' },
        { value: 'kit', label: 'Drop kit', panel: 'drops' },
      ]}
    />,
  );
  await userEvent.click(screen.getByRole('tab', { name: 'Strip' }));
  await userEvent.keyboard('{ArrowRight}{Enter}');
  expect(screen.getByRole('tab', { name: 'Drop kit' })).toHaveAttribute('aria-selected', 'true');
  expect(screen.getByRole('tabpanel')).toHaveTextContent('drops');
});

it('says how far the ruler has come', () => {
  render(<ProgressRuler parts={5} current={2} label="Step 2 of 5: lining" />);
  const ruler = screen.getByRole('progressbar', { name: 'Step 2 of 5: lining' });
  expect(ruler).toHaveAttribute('aria-valuenow', '2');
  expect(ruler).toHaveAttribute('aria-valuemax', '5');
});

it('puts the severity before everything else', () => {
  render(
    <Callout severity="stop" word="Stop" title="Never let two different pool products touch.">
      <p>Not dry, not wet.</p>
    </Callout>,
  );
  expect(screen.getByText('Stop').compareDocumentPosition(screen.getByText('Not dry, not wet.'))).toBe(
    Node.DOCUMENT_POSITION_FOLLOWING,
  );
});

it('gives each state of the verdict a frame of its own', () => {
  const states: VerdictFrameState[] = ['stay-out', 'wait', 'test-first', 'fine'];
  const frames = states.map((state) => {
    const { container, unmount } = render(<VerdictFrame state={state} word={state} headline="The water" />);
    const box = container.firstElementChild;
    const look = `${box?.className} ${box?.querySelector('svg')?.getAttribute('class')}`;
    unmount();
    return look;
  });
  expect(new Set(frames).size).toBe(4);
});
