/** How soon code is asked for again, and how seldom at last [ms]. */
const SOON = 1000;
const SELDOM = 30_000;

/**
 * Code that a page fetches after it is drawn. Where the connection has gone it is asked for again until it comes: what is on the
 * page already, the steps of a dose among it, must not make room for an apology because a chart could not be fetched.
 */
export async function untilFetched<Part>(fetchPart: () => Promise<Part>): Promise<Part> {
  for (let patience = SOON; ; patience = Math.min(2 * patience, SELDOM))
    try {
      return await fetchPart();
    } catch (problem) {
      // A fault in the code itself stays one.
      if (!(problem instanceof Error) || problem.name !== 'ChunkLoadError') throw problem;
      await untilOnlineOr(patience);
    }
}

function untilOnlineOr(patience: number): Promise<void> {
  return new Promise((resolve) => {
    const goOn = () => {
      clearTimeout(timer);
      window.removeEventListener('online', goOn);
      resolve();
    };
    const timer = setTimeout(goOn, patience);
    window.addEventListener('online', goOn);
  });
}
