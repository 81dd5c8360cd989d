'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState } from 'react';
import { RequestProblem } from './fetch-json';

const MINUTE = 60_000;

/** What the server says will not change by asking again; no answer may. */
function worthAnotherTry(failures: number, problem: Error): boolean {
  const noAnswer =
    problem instanceof RequestProblem && (problem.code === 'no-connection' || problem.code === 'engine-busy');
  return noAnswer && failures < 2;
}

export function Providers({ children }: { children: React.ReactNode }) {
  // One client per page load, made in state: a module's own would be shared between people on the server.
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: {
          queries: { staleTime: MINUTE, retry: worthAnotherTry },
          // A dose or a reading is never sent twice behind someone's back.
          mutations: { retry: false },
        },
      }),
  );
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
