import { answering } from './answering';
import type { TryItQuestion } from './messages';

const channel = new MessageChannel();

/** Waits for one turn of the event loop, in which a newer question can come in. */
function pause(): Promise<void> {
  return new Promise((resolve) => {
    channel.port1.onmessage = () => resolve();
    channel.port2.postMessage(undefined);
  });
}

const answer = answering((message) => self.postMessage(message), pause);

self.addEventListener('message', ({ data }: MessageEvent<TryItQuestion>) => void answer(data));
