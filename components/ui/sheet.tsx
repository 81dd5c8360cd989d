'use client';

import dynamic from 'next/dynamic';
import { untilFetched } from './until-fetched';
import { useIdleFetch } from './use-idle-fetch';
import { useOpenedOnce } from './use-opened-once';

export type SheetProps = {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: React.ReactNode;
  closeLabel: string;
  children: React.ReactNode;
  /** Leaves this much room below, for a bar that must stay in reach. */
  aboveTabs?: boolean;
};

const fetchPanel = () => import('./sheet-panel');
const Panel = dynamic(() => untilFetched(() => import('./sheet-panel')).then(({ SheetPanel }) => SheetPanel), {
  ssr: false,
});

/** Rises over a phone page from its lower edge, under a double rule. What draws it is fetched once the page stands. */
export function Sheet(props: SheetProps) {
  useIdleFetch(fetchPanel);
  const opened = useOpenedOnce(props.open);
  return opened ? <Panel {...props} /> : null;
}
