import { fireEvent, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { SampleAnswer } from '@/components/start/sample-week/sample-answer';
import LiveSample from '@/components/start/sample-week/live-sample';
import { sampleWeek } from '@/lib/planner/sample-week';
import { type SampleWater, startingSample } from '@/lib/schemas/sample-water';
import { renderWithWords } from '@/tests/support/with-words';

/** The engine's thread, in this one: it answers in the next turn. */
class SameThread {
  onmessage: ((event: { data: unknown }) => void) | null = null;
  onerror: ((event: unknown) => void) | null = null;
  postMessage(water: SampleWater) {
    setTimeout(() => this.onmessage?.({ data: { week: sampleWeek(water) } }));
  }
  terminate() {
    this.onmessage = null;
  }
}

beforeEach(() => vi.stubGlobal('Worker', SameThread));
afterEach(() => vi.unstubAllGlobals());

const start = sampleWeek(startingSample);

it('follows a slider, and goes back', async () => {
  renderWithWords(<LiveSample start={start} unitSystem="metric" begin={{ water: startingSample, moved: undefined }} />);
  const status = screen.getByRole('status');
  const before = status.textContent;
  expect(screen.queryByText('Put back')).toBeNull();
  fireEvent.change(screen.getByRole('slider', { name: 'Stabilizer' }), { target: { value: '100' } });
  await screen.findByText('Replace some water first.');
  expect(screen.getByText(/Dots: before you moved anything/)).toBeTruthy();
  fireEvent.click(screen.getByText('Put back'));
  expect(status.textContent).toBe(before);
});

it('goes on from where the sliders stood before it came, with the focus where it was', async () => {
  const water = { ...startingSample, stabilizer: 100 };
  renderWithWords(<LiveSample start={start} unitSystem="metric" begin={{ water, moved: 'stabilizer' }} />);
  const slider = screen.getByRole('slider', { name: 'Stabilizer' });
  expect(slider).toHaveProperty('value', '100');
  expect(document.activeElement).toBe(slider);
  await screen.findByText('Replace some water first.');
});

it('works the week out itself where the server sent none', async () => {
  renderWithWords(
    <LiveSample start={undefined} unitSystem="metric" begin={{ water: startingSample, moved: undefined }} />,
  );
  screen.getByText('The week is being worked out.');
  await screen.findByText('Two evenings in seven days.');
});

it('says when no week could be worked out', async () => {
  vi.stubGlobal(
    'Worker',
    class extends SameThread {
      override postMessage(water: SampleWater) {
        setTimeout(() => this.onmessage?.({ data: { failed: water } }));
      }
    },
  );
  renderWithWords(<LiveSample start={start} unitSystem="metric" begin={{ water: startingSample, moved: undefined }} />);
  fireEvent.change(screen.getByRole('slider', { name: 'Sun' }), { target: { value: '2' } });
  await waitFor(() => screen.getByText(/could not be worked out/));
});

it('says amounts in the measures of the visitor', () => {
  const { rerender } = renderWithWords(<SampleAnswer week={start} unitSystem="metric" />);
  screen.getByText('Saturday: 400 mL of liquid');
  rerender(<SampleAnswer week={start} unitSystem="us" />);
  screen.getByText(/Saturday: [\d.]+ fl oz of liquid/);
});
