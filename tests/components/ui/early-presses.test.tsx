import { act } from 'react';
import { hydrateRoot } from 'react-dom/client';
import { renderToString } from 'react-dom/server';
import { expect, it, vi } from 'vitest';
import { Button } from '@/components/ui/button';
import { earlyPressesScript } from '@/components/ui/early-presses';

// The script of the page's head, run as the browser runs it.
const run = new Function(earlyPressesScript);

async function drawnByServer(
  element: React.ReactElement,
): Promise<{ button: HTMLButtonElement; listen: () => Promise<void> }> {
  const place = document.createElement('div');
  place.innerHTML = renderToString(element);
  document.body.append(place);
  const button = place.querySelector('button');
  if (button === null) throw new Error('no button');
  return { button, listen: () => act(async () => void hydrateRoot(place, element)) };
}

it('does once what was pressed before anybody listened, however often it was pressed', async () => {
  run();
  const pressed = vi.fn();
  const { button, listen } = await drawnByServer(<Button onClick={pressed}>Given</Button>);
  button.click();
  button.click();
  await listen();
  expect(pressed).toHaveBeenCalledTimes(1);
  button.click();
  expect(pressed).toHaveBeenCalledTimes(2);
});

it('does nothing that was not pressed', async () => {
  run();
  const pressed = vi.fn();
  const { listen } = await drawnByServer(<Button onClick={pressed}>Given</Button>);
  await listen();
  expect(pressed).not.toHaveBeenCalled();
});

it('leaves a button alone that turns out to be off', async () => {
  run();
  const pressed = vi.fn();
  const { button, listen } = await drawnByServer(
    <Button onClick={pressed} offReason="Nothing to give today">
      Given
    </Button>,
  );
  button.click();
  await listen();
  expect(pressed).not.toHaveBeenCalled();
});

it('gives its own ref to whoever asks for it', async () => {
  run();
  const seen: (HTMLButtonElement | null)[] = [];
  const { button, listen } = await drawnByServer(<Button ref={(node) => void seen.push(node)}>Given</Button>);
  await listen();
  expect(seen).toContain(button);
});
