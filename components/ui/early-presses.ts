/** Stands on a button until React listens to it. */
export const UNHEARD = 'data-unheard';

declare global {
  interface Window {
    /** The buttons that were pressed before React listened to them. */
    earlyPresses?: Set<Element>;
  }
}

/**
 * Runs before any other script of a page: a press on the words that came from the server waits for the code that does what it
 * asks for. Nobody else hears of it, or it would be done twice.
 */
export const earlyPressesScript = `
window.earlyPresses = new Set();
addEventListener('click', (event) => {
  const button = event.target.closest('button[${UNHEARD}]');
  if (button === null) return;
  window.earlyPresses.add(button);
  event.stopImmediatePropagation();
}, true);
`;
