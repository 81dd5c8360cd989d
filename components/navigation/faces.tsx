import { useTranslations } from 'next-intl';
import { Avatar, type AvatarRing } from '@/components/ui/avatar';
import type { FramePerson } from './member';

/** The ring of a face, by role. */
export const ringOf: Record<FramePerson['role'], AvatarRing> = { owner: 'solid', caretaker: 'line', viewer: 'dashed' };

/** At most this many faces fit beside the siren of a phone. */
const SHOWN = 3;

/** The faces of a household, overlapping. The ring repeats the role that the words beside it say. */
export function Faces({ people }: { people: readonly FramePerson[] }) {
  const t = useTranslations('navigation');
  return (
    <span className="inline-flex items-center" role="img" aria-label={t('faces', { count: people.length })}>
      {people.slice(0, SHOWN).map((person, index) => (
        <Avatar
          key={`${person.name}-${index}`}
          name={person.name}
          ring={ringOf[person.role]}
          // On the narrowest phones the name beside them needs the room.
          className="-ml-1.75 outline-2 outline-paper first:ml-0 not-first:max-[379px]:hidden"
        />
      ))}
    </span>
  );
}
