import { badForms } from './journeys/bad-forms';
import { badRequests } from './journeys/bad-requests';
import { cardOffline } from './journeys/card-offline';
import { cards } from './journeys/cards';
import { clockChanges } from './journeys/clock-changes';
import { firstWeek } from './journeys/first-week';
import { handOver } from './journeys/hand-over';
import { headers } from './journeys/headers';
import { house } from './journeys/house';
import { byKeyboard, escape } from './journeys/keyboard';
import { labelBoxes } from './journeys/label-boxes';
import { landing } from './journeys/landing';
import { lateCode } from './journeys/late-code';
import { leaving } from './journeys/leaving';
import { learning } from './journeys/learning';
import { lookRound } from './journeys/look-round';
import { limits } from './journeys/limits';
import { looks } from './journeys/looks';
import { mail } from './journeys/mail';
import { measures } from './journeys/measures';
import { measuring } from './journeys/measuring';
import { passkeys } from './journeys/passkeys';
import { photos } from './journeys/photos';
import { roleMatrix } from './journeys/role-matrix';
import { scope } from './journeys/scope';
import { members } from './journeys/members';
import { paper } from './journeys/paper';
import { situations } from './journeys/situations';
import { choosingLanguage, inSpanish, spanishPages } from './journeys/spanish';
import { stop } from './journeys/stop';
import { tryIt } from './journeys/try-it';
import { throughTheWeeks } from './journeys/through-the-weeks';
import type { Journey } from './support/journey';

/** Every journey of a run, the long ones first. */
export const journeys: readonly Journey[] = [
  lookRound,
  ...looks,
  firstWeek,
  inSpanish,
  spanishPages,
  byKeyboard,
  badForms,
  badRequests,
  roleMatrix,
  ...clockChanges,
  labelBoxes,
  measures,
  learning,
  house,
  tryIt,
  paper,
  scope,
  stop,
  situations,
  throughTheWeeks,
  cards,
  cardOffline,
  escape,
  members,
  mail,
  leaving,
  handOver,
  passkeys,
  limits,
  photos,
  choosingLanguage,
  landing,
  lateCode,
  headers,
  measuring,
];
