import { screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { EmergencyCard } from '@/components/help/emergency-card';
import { SafetyCard } from '@/components/help/safety-card';
import { renderWithWords } from '@/tests/support/with-words';

it('dials the numbers of the country', () => {
  renderWithWords(<EmergencyCard country="US" />);
  expect(screen.getByRole('link', { name: 'Call emergency 911' })).toHaveAttribute('href', 'tel:911');
  expect(screen.getByRole('link', { name: 'Poison centre 1-800-222-1222' })).toHaveAttribute('href', 'tel:18002221222');
  expect(screen.getByRole('link', { name: 'Fire service 911' })).toHaveAttribute('href', 'tel:911');
});

it('dials nothing where no number is certain, and says whom to call', () => {
  renderWithWords(<EmergencyCard country="other" />);
  expect(screen.getByText('Call your local emergency number.')).toBeInTheDocument();
  const dialling = screen.getAllByRole('link').filter((link) => link.getAttribute('href')?.startsWith('tel:'));
  expect(dialling).toEqual([]);
});

it('offers the other countries as plain links', () => {
  renderWithWords(<EmergencyCard country="EU" />);
  const countries = within(screen.getByRole('navigation', { name: 'Numbers for another country' }));
  expect(countries.getByRole('link', { current: true })).toHaveTextContent('the European Union');
  expect(countries.getByRole('link', { name: 'Australia' })).toHaveAttribute('href', '?country=AU');
});

// care.md 8, word by word where a word decides.
it.each([
  ['Breathed it', ['Fresh air, sit up.', 'Call emergency if breathing is hard.', 'It can get worse hours later.']],
  [
    'In the eyes',
    [
      'Rinse with running tap water for at least 15 minutes, longer if the label says so.',
      'Contact lenses out.',
      'Then a doctor.',
    ],
  ],
  ['On the skin', ['Clothes off.', 'Rinse for at least 15 minutes.']],
  ['Swallowed', ['Rinse the mouth.', 'Do not make them sick.', 'Poison centre, with the label in hand.']],
  ['Out of the pool with burning eyes or cough', ['Everyone out.', 'Pump and feeder off, if that is safe.', 'Call.']],
])('keeps the steps for: %s', (title, steps) => {
  renderWithWords(<EmergencyCard country="US" />);
  const body = screen.getByRole('heading', { name: title }).parentElement;
  if (!body) throw new Error('The heading stands alone');
  const items = within(body).getAllByRole('listitem');
  expect(items.map((item) => item.textContent?.replace(/^\d/, ''))).toEqual(steps);
});

it('tells nobody to put anything on a spill but water, and on acid nothing at all', () => {
  renderWithWords(<EmergencyCard country="US" />);
  const spill = screen.getByRole('region', { name: 'A spill' });
  expect(spill).toHaveTextContent('Dirty, wet or mixedLeave. Fire service.');
  expect(spill).toHaveTextContent('AcidKeep people and chlorine away. Call for advice.');
  expect(spill).not.toHaveTextContent(/soda/i);
});

it('has the Stop before every rule of the safety card, and the emergency card at its end', () => {
  renderWithWords(<SafetyCard />);
  const stop = screen.getByText('Never let two different pool products touch.');
  for (const heading of screen.getAllByRole('heading', { level: 2 })) {
    expect(stop.compareDocumentPosition(heading)).toBe(Node.DOCUMENT_POSITION_FOLLOWING);
  }
  expect(screen.getByRole('link', { name: 'Emergency card' })).toHaveAttribute('href', '/help/emergency');
});
