'use client';

import dynamic from 'next/dynamic';
import { untilFetched } from './until-fetched';
import { useIdleFetch } from './use-idle-fetch';
import { useOpenedOnce } from './use-opened-once';

export type DialogProps = {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: React.ReactNode;
  /** One sentence under the title, read out when the dialog opens. */
  description?: React.ReactNode;
  closeLabel: string;
  children?: React.ReactNode;
  /** The buttons at the end, main one first. */
  actions?: React.ReactNode;
};

const fetchPanel = () => import('./dialog-panel');
const Panel = dynamic(() => untilFetched(() => import('./dialog-panel')).then(({ DialogPanel }) => DialogPanel), {
  ssr: false,
});

/** A question that has to be answered before going on. What draws it is fetched once the page stands. */
export function Dialog(props: DialogProps) {
  useIdleFetch(fetchPanel);
  const opened = useOpenedOnce(props.open);
  return opened ? <Panel {...props} /> : null;
}
