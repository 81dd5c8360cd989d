import { SignedOutBar } from '@/components/navigation/signed-out-bar';
import { contentId, SkipLink } from '@/components/navigation/skip-link';
import { ClientMessages } from '@/lib/messages/client-messages';

export default function StartLayout({ children }: { children: React.ReactNode }) {
  return (
    <ClientMessages namespaces={['start']}>
      <SkipLink />
      <SignedOutBar />
      <main id={contentId} tabIndex={-1} className="outline-none">
        {children}
      </main>
    </ClientMessages>
  );
}
