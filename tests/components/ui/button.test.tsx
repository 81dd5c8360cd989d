import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import { Button } from '@/components/ui/button';

it('does what it says once it is pressed', async () => {
  const press = vi.fn();
  render(<Button onClick={press}>Save test</Button>);
  await userEvent.click(screen.getByRole('button', { name: 'Save test' }));
  expect(press).toHaveBeenCalledOnce();
});

it('says why it is off, to everyone, and does nothing', async () => {
  const press = vi.fn();
  render(
    <Button onClick={press} offReason="Only those who handle chemicals can tick a dose.">
      Mark as added
    </Button>,
  );
  const button = screen.getByRole('button', { name: 'Mark as added' });
  expect(button).toHaveAccessibleDescription('Only those who handle chemicals can tick a dose.');
  expect(button).toHaveAttribute('aria-disabled', 'true');
  expect(button).toHaveClass('border-dashed');
  await userEvent.tab();
  expect(button).toHaveFocus();
  await userEvent.click(button);
  await userEvent.keyboard('{Enter}');
  expect(press).not.toHaveBeenCalled();
});

it('can take its reason from elsewhere on the page', () => {
  render(
    <>
      <p id="why">Answer the question above first.</p>
      <Button offReasonId="why">Next</Button>
    </>,
  );
  expect(screen.getByRole('button', { name: 'Next' })).toHaveAccessibleDescription('Answer the question above first.');
});

it('changes its word while it works and swallows further clicks, of a form as well', async () => {
  const submit = vi.fn((event: React.SubmitEvent) => event.preventDefault());
  const { rerender } = render(
    <form onSubmit={submit}>
      <Button type="submit">Save</Button>
    </form>,
  );
  await userEvent.click(screen.getByRole('button', { name: 'Save' }));
  rerender(
    <form onSubmit={submit}>
      <Button type="submit" busy="Saving">
        Save
      </Button>
    </form>,
  );
  const button = screen.getByRole('button', { name: 'Saving' });
  await userEvent.click(button);
  expect(button).toHaveAttribute('aria-busy', 'true');
  expect(submit).toHaveBeenCalledOnce();
});
