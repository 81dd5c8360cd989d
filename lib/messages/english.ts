import common from './en/common.json';
import doses from './en/doses.json';
import events from './en/events.json';
import firstRun from './en/first-run.json';
import help from './en/help.json';
import house from './en/house.json';
import household from './en/household.json';
import how from './en/how.json';
import howConstants from './en/how-constants.json';
import howExamples from './en/how-examples.json';
import invitation from './en/invitation.json';
import learnt from './en/learnt.json';
import mail from './en/mail.json';
import navigation from './en/navigation.json';
import passkeys from './en/passkeys.json';
import photos from './en/photos.json';
import pool from './en/pool.json';
import privacy from './en/privacy.json';
import problems from './en/problems.json';
import readings from './en/readings.json';
import rounds from './en/rounds.json';
import situations from './en/situations.json';
import start from './en/start.json';
import tour from './en/tour.json';
import tryOut from './en/try-out.json';
import units from './en/units.json';
import verdict from './en/verdict.json';
import week from './en/week.json';
import weekPrint from './en/week-print.json';

/** Every word of the product, one namespace a file. A new file is added here and in the other language, and is then typed and
 * served everywhere. */
export const english = {
  common,
  doses,
  events,
  'first-run': firstRun,
  help,
  house,
  household,
  how,
  'how-constants': howConstants,
  'how-examples': howExamples,
  invitation,
  learnt,
  mail,
  navigation,
  passkeys,
  photos,
  pool,
  privacy,
  problems,
  readings,
  rounds,
  situations,
  start,
  tour,
  'try-out': tryOut,
  units,
  verdict,
  week,
  'week-print': weekPrint,
};

export type Catalogue = typeof english;
