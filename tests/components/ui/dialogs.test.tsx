import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { expect, it } from 'vitest';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Sheet } from '@/components/ui/sheet';

function Ask() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button onClick={() => setOpen(true)}>Another amount</Button>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title="Was it added twice?"
        description="Stay out, test in the morning."
        closeLabel="Close"
        actions={<Button onClick={() => setOpen(false)}>Once only</Button>}
      />
    </>
  );
}

it('takes the focus, is named and described, and gives the focus back on Escape', async () => {
  render(<Ask />);
  const opener = screen.getByRole('button', { name: 'Another amount' });
  await userEvent.click(opener);
  const dialog = await screen.findByRole('dialog', { name: 'Was it added twice?' });
  expect(dialog).toHaveAccessibleDescription('Stay out, test in the morning.');
  await waitFor(() => expect(dialog).toContainElement(document.activeElement as HTMLElement));
  await userEvent.keyboard('{Escape}');
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
  await waitFor(() => expect(opener).toHaveFocus());
});

it('closes a sheet by its cross', async () => {
  function More() {
    const [open, setOpen] = useState(true);
    return (
      <Sheet open={open} onOpenChange={setOpen} title="More" closeLabel="Close More">
        <a href="/help">Help</a>
      </Sheet>
    );
  }
  render(<More />);
  expect(await screen.findByRole('dialog', { name: 'More' })).toBeInTheDocument();
  await userEvent.click(screen.getByRole('button', { name: 'Close More' }));
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
});
