import common from './es/common.json';
import doses from './es/doses.json';
import events from './es/events.json';
import firstRun from './es/first-run.json';
import help from './es/help.json';
import house from './es/house.json';
import household from './es/household.json';
import how from './es/how.json';
import howConstants from './es/how-constants.json';
import howExamples from './es/how-examples.json';
import invitation from './es/invitation.json';
import learnt from './es/learnt.json';
import mail from './es/mail.json';
import navigation from './es/navigation.json';
import passkeys from './es/passkeys.json';
import photos from './es/photos.json';
import pool from './es/pool.json';
import privacy from './es/privacy.json';
import problems from './es/problems.json';
import readings from './es/readings.json';
import rounds from './es/rounds.json';
import situations from './es/situations.json';
import start from './es/start.json';
import tour from './es/tour.json';
import tryOut from './es/try-out.json';
import units from './es/units.json';
import verdict from './es/verdict.json';
import week from './es/week.json';
import weekPrint from './es/week-print.json';
import type { Catalogue } from './english';

/** The same words in Spanish, as they are said in Spain and in America alike. */
export const spanish: Catalogue = {
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
