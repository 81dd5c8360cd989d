import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import { ToastProvider, useToast } from '@/components/ui/toast';

it('tells the news with a way back, and goes when it is closed', async () => {
  const undo = vi.fn();
  function Tick() {
    const show = useToast();
    return (
      <button
        type="button"
        onClick={() =>
          show({ title: 'Ticked', description: '10 minutes to undo', action: { label: 'Undo', onPress: undo } })
        }
      >
        Tick
      </button>
    );
  }
  render(
    <ToastProvider closeLabel="Close">
      <Tick />
    </ToastProvider>,
  );
  await userEvent.click(screen.getByRole('button', { name: 'Tick' }));
  expect((await screen.findAllByText('Ticked')).length).toBeGreaterThan(0);
  await userEvent.click(screen.getByRole('button', { name: 'Undo', hidden: true }));
  expect(undo).toHaveBeenCalledOnce();
  await userEvent.click(screen.getByRole('button', { name: 'Close', hidden: true }));
  await waitFor(() => expect(screen.queryByText('10 minutes to undo')).not.toBeInTheDocument());
});
