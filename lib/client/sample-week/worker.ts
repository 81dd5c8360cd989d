import { sampleWeek } from '@/lib/planner/sample-week';
import type { SampleAnswer, SampleQuestion } from './messages';

const say = (answer: SampleAnswer) => self.postMessage(answer);

self.addEventListener('message', ({ data: water }: MessageEvent<SampleQuestion>) => {
  try {
    say({ week: sampleWeek(water) });
  } catch (fault) {
    say({ failed: water });
    throw fault;
  }
});
