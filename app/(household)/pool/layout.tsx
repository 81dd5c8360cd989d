import { ClientMessages } from '@/lib/messages/client-messages';

export default function PoolLayout({ children }: { children: React.ReactNode }) {
  return <ClientMessages namespaces={['first-run', 'learnt', 'pool', 'units']}>{children}</ClientMessages>;
}
