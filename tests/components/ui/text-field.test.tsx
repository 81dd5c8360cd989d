import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { expect, it } from 'vitest';
import { NumberTextField } from '@/components/ui/number-text-field';
import { TextField } from '@/components/ui/text-field';

it('is named by its label and described by its hint', () => {
  render(<TextField label="Name of the pool" hint="Stands at the top of the sheet." />);
  const field = screen.getByRole('textbox', { name: 'Name of the pool' });
  expect(field).toHaveAccessibleDescription('Stands at the top of the sheet.');
  expect(field).not.toHaveAttribute('aria-invalid');
});

it('puts the problem in the place of the hint and keeps what was typed', async () => {
  const { rerender } = render(<TextField label="pH" hint="From 6.2 to 9." />);
  await userEvent.type(screen.getByRole('textbox'), '76');
  rerender(<TextField label="pH" hint="From 6.2 to 9." problem="pH runs from 6.2 to 9. Did you mean 7.6?" />);
  const field = screen.getByRole('textbox', { name: 'pH' });
  expect(field).toHaveAccessibleDescription('pH runs from 6.2 to 9. Did you mean 7.6?');
  expect(field).toHaveAttribute('aria-invalid', 'true');
  expect(field).toHaveValue('76');
  expect(screen.queryByText('From 6.2 to 9.')).not.toBeInTheDocument();
});

it('keeps a decimal comma, a slip and anything else exactly as typed', async () => {
  function Volume() {
    const [text, setText] = useState('');
    return <NumberTextField label="Volume" value={text} onChange={(event) => setText(event.target.value)} />;
  }
  render(<Volume />);
  const field = screen.getByRole('textbox', { name: 'Volume' });
  await userEvent.type(field, '68,5 about');
  expect(field).toHaveValue('68,5 about');
  expect(field).toHaveAttribute('type', 'text');
  expect(field).toHaveAttribute('inputmode', 'decimal');
});
