import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { expect, it } from 'vitest';
import { Select } from '@/components/ui/select';

const options = [
  { value: 'plaster', label: 'Plaster' },
  { value: 'vinyl', label: 'Sheet liner' },
] as const;

function Surface({ problem }: { problem?: string }) {
  const [surface, setSurface] = useState<'plaster' | 'vinyl' | null>(null);
  return (
    <Select
      label="Surface"
      hint="Sets how much calcium the water may hold."
      problem={problem}
      options={options}
      value={surface}
      onChange={setSurface}
      placeholder="Choose"
    />
  );
}

it('is named, opens by keyboard and takes an answer', async () => {
  render(<Surface />);
  const control = screen.getByRole('combobox', { name: 'Surface' });
  expect(control).toHaveTextContent('Choose');
  expect(control).toHaveAccessibleDescription('Sets how much calcium the water may hold.');
  await userEvent.tab();
  expect(control).toHaveFocus();
  await userEvent.keyboard('{Enter}');
  await userEvent.click(await screen.findByRole('option', { name: 'Sheet liner' }));
  expect(control).toHaveTextContent('Sheet liner');
});

it('says what is wrong', () => {
  render(<Surface problem="Choose what the pool is lined with." />);
  const control = screen.getByRole('combobox', { name: 'Surface' });
  expect(control).toHaveAccessibleDescription('Choose what the pool is lined with.');
  expect(control).toHaveAttribute('aria-invalid', 'true');
});
