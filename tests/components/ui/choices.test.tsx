import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { expect, it } from 'vitest';
import { RadioRows } from '@/components/ui/radio-rows';
import { Segments } from '@/components/ui/segments';

const choices = [
  { value: 'never', label: 'never' },
  { value: 'night', label: 'at night' },
  { value: 'always', label: 'day and night', detail: 'while nobody swims' },
] as const;
type Cover = (typeof choices)[number]['value'];

function Covers({ as: Choice }: { as: typeof Segments<Cover> | typeof RadioRows<Cover> }) {
  const [cover, setCover] = useState<Cover | null>(null);
  return <Choice label="A cover is on" hint="Off before a dose." choices={choices} value={cover} onChange={setCover} />;
}

it.each([
  ['Segments', Segments<Cover>],
  ['RadioRows', RadioRows<Cover>],
])('%s start without an answer and go by mouse and arrow keys', async (_name, as) => {
  render(<Covers as={as} />);
  const group = screen.getByRole('group', { name: 'A cover is on' });
  expect(group).toHaveAccessibleDescription('Off before a dose.');
  for (const radio of screen.getAllByRole('radio')) expect(radio).not.toBeChecked();

  await userEvent.click(screen.getByText('at night'));
  expect(screen.getByRole('radio', { name: 'at night' })).toBeChecked();

  await userEvent.keyboard('{ArrowRight}');
  expect(screen.getByRole('radio', { name: /day and night/ })).toBeChecked();
  expect(screen.getByRole('radio', { name: 'at night' })).not.toBeChecked();
});
