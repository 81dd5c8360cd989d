import { CalendarDays, TestTubeDiagonal } from 'lucide-react';

/**
 * The places that exist today, in the order of a week. A place is added here when its pages are; a name that led nowhere
 * would be worse than no name.
 */
export const weeklyPlaces = [
  { href: '/week', name: 'week', shortName: 'weekShort', Icon: CalendarDays },
  { href: '/test', name: 'test', shortName: 'testShort', Icon: TestTubeDiagonal },
] as const;

/** On a desk the bar holds these too; a phone finds them under More. */
export const barPlaces = [...weeklyPlaces, { href: '/situations', name: 'situations' }] as const;
