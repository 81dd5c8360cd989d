'use client';

import Link from 'next/link';
import { useState } from 'react';

/**
 * A link to another page of ours, whose code is fetched when somebody means to go there: a pointer or the focus on it. Next.js
 * would fetch that of every link in sight, while a phone is still busy with the page it is on.
 */
export function PageLink(props: Omit<React.ComponentProps<typeof Link>, 'prefetch' | 'onPointerEnter' | 'onFocus'>) {
  const [meant, setMeant] = useState(false);
  const means = () => setMeant(true);
  return <Link {...props} prefetch={meant ? null : false} onPointerEnter={means} onFocus={means} />;
}
