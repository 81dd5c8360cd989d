'use client';

import { Printer } from 'lucide-react';
import { Button } from '@/components/ui/button';

export function PrintButton({ label }: { label: string }) {
  return (
    <span className="hidden md:inline print:hidden">
      <Button size="small" onClick={() => window.print()}>
        <Printer aria-hidden="true" className="size-4.5" />
        {label}
      </Button>
    </span>
  );
}
