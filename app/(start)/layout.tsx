import { ClientMessages } from '@/lib/messages/client-messages';

/** The first run draws a head of its own, so the bar stands one folder deeper. */
export default function StartLayout({ children }: { children: React.ReactNode }) {
  const parts = { start: ['landing', 'signIn', 'signUp', 'form'], passkeys: ['signIn', 'problem'] };
  return <ClientMessages parts={parts}>{children}</ClientMessages>;
}
