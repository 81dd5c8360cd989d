/** So long a page is left alone after it is drawn: on a phone its first seconds belong to whoever looks at it [ms]. */
const A_WHILE = 5000;

/** Begins when the page has been drawn for a while, or somebody begins to use it. Returns what ends the waiting. */
export function whenLeftAlone(begin: () => void): () => void {
  const uses = ['pointerdown', 'keydown'] as const;
  const start = () => {
    end();
    begin();
  };
  const timer = setTimeout(start, A_WHILE);
  for (const use of uses) window.addEventListener(use, start, { passive: true });
  const end = () => {
    clearTimeout(timer);
    for (const use of uses) window.removeEventListener(use, start);
  };
  return end;
}
