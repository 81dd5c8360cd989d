import { SignedOutShell } from '@/components/navigation/signed-out-shell';
import { findHousehold } from '@/lib/auth/page-gate';

/** The bar round the pages before the door: start page, sign-in, sign-up. */
export default async function DoorLayout({ children }: { children: React.ReactNode }) {
  const visit = await findHousehold();
  return <SignedOutShell signedIn={visit !== null}>{children}</SignedOutShell>;
}
