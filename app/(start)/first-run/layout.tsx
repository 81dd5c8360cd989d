import { ClientMessages } from '@/lib/messages/client-messages';

export default function FirstRunLayout({ children }: { children: React.ReactNode }) {
  return <ClientMessages namespaces={['first-run', 'pool', 'units']}>{children}</ClientMessages>;
}
