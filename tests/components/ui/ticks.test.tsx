import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { expect, it, vi } from 'vitest';
import { Switch } from '@/components/ui/switch';
import { TickBox } from '@/components/ui/tick-box';

it('ticks and unticks by its words and by the space bar', async () => {
  function Kit() {
    const [on, setOn] = useState(false);
    return <TickBox label="a drop kit" checked={on} onChange={setOn} />;
  }
  render(<Kit />);
  const box = screen.getByRole('checkbox', { name: 'a drop kit' });
  await userEvent.click(screen.getByText('a drop kit'));
  expect(box).toBeChecked();
  await userEvent.keyboard(' ');
  expect(box).not.toBeChecked();
});

it('keeps a box that is off as it is, and says why', async () => {
  const change = vi.fn();
  render(<TickBox label="Mark as added" checked={false} onChange={change} offReason="You look on." />);
  const box = screen.getByRole('checkbox', { name: /Mark as added/ });
  expect(box).toHaveAccessibleDescription('You look on.');
  await userEvent.click(box);
  expect(change).not.toHaveBeenCalled();
  expect(box).not.toBeChecked();
});

it('switches', async () => {
  function Handles() {
    const [on, setOn] = useState(false);
    return <Switch label="Handles chemicals" detail="adult; safety card read" checked={on} onChange={setOn} />;
  }
  render(<Handles />);
  const control = screen.getByRole('switch', { name: 'Handles chemicals' });
  expect(control).toHaveAccessibleDescription('adult; safety card read');
  await userEvent.click(screen.getByText('Handles chemicals'));
  expect(control).toBeChecked();
  await userEvent.keyboard(' ');
  expect(control).not.toBeChecked();
});
