import { useState } from 'react';

/** Whether something has ever been open: from then on it stays, so that it can be seen closing. */
export function useOpenedOnce(open: boolean): boolean {
  const [opened, setOpened] = useState(open);
  if (open && !opened) setOpened(true);
  return open || opened;
}
