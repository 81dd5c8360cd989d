import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import { Stepper } from '@/components/ui/stepper';

it('steps by its two keys and by the arrow keys, and takes typing', async () => {
  const step = vi.fn();
  const change = vi.fn();
  render(
    <Stepper
      label="Slow tablets"
      value="3"
      onChange={change}
      onStep={step}
      moreLabel="one more"
      lessLabel="one less"
    />,
  );
  await userEvent.click(screen.getByRole('button', { name: 'one more' }));
  await userEvent.click(screen.getByRole('button', { name: 'one less' }));
  const field = screen.getByRole('textbox', { name: 'Slow tablets' });
  await userEvent.click(field);
  await userEvent.keyboard('{ArrowUp}{ArrowDown}');
  expect(step.mock.calls).toEqual([[1], [-1], [1], [-1]]);
  await userEvent.type(field, ',5');
  expect(change).toHaveBeenCalledWith('3,');
});
