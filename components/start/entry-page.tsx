import { LanguageLinks } from '@/components/navigation/language-links';
import { DoubleRule } from '@/components/ui/double-rule';
import { textLink } from '@/components/ui/text-link';

/** The page round a form that opens a door. */
export function EntryPage({ title, lead, children }: { title: string; lead: string; children: React.ReactNode }) {
  return (
    <div className="mx-auto max-w-sheet px-margin">
      <DoubleRule className="hidden md:block" />
      <div className="mx-auto max-w-form pt-6 pb-16 md:pt-12">
        <h1 className="font-display text-headline">{title}</h1>
        <p className="mt-1 mb-6 text-body text-ink-2">{lead}</p>
        {children}
        <p className="mt-4">
          <LanguageLinks className={`inline-flex min-h-11 items-center ${textLink}`} />
        </p>
      </div>
    </div>
  );
}
