/**
 * Calls back as soon as what is about to be drawn is on the screen: in the first task after the next frame. Called from a
 * layout effect that is the frame of what React has just changed.
 *
 * @returns gives it up
 */
export function whenPainted(then: () => void): () => void {
  const { port1: after, port2: frameEnd } = new MessageChannel();
  after.onmessage = () => {
    after.close();
    then();
  };
  const frame = requestAnimationFrame(() => frameEnd.postMessage(undefined));
  return () => {
    cancelAnimationFrame(frame);
    after.close();
  };
}
