import { renderToString } from 'react-dom/server';
import { expect, it } from 'vitest';
import { Button } from '@/components/ui/button';

it('sends no form before React listens, because that would lose what was typed', () => {
  expect(renderToString(<Button type="submit">Sign in</Button>)).toMatch(/<button[^>]* disabled=""/);
  expect(renderToString(<Button>Another amount</Button>)).not.toMatch(/ disabled=""/);
});
