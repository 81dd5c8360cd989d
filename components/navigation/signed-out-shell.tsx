import { SignedOutBar } from './signed-out-bar';
import { contentId, SkipLink } from './skip-link';

/** The bar and the content for whoever has no finished household yet. */
export function SignedOutShell({ signedIn = false, children }: { signedIn?: boolean; children: React.ReactNode }) {
  return (
    <>
      <SkipLink />
      <SignedOutBar signedIn={signedIn} />
      <main id={contentId} tabIndex={-1} className="outline-none">
        {children}
      </main>
    </>
  );
}
