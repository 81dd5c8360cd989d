import { Activity } from 'react';

/**
 * A part of a page that the server draws with it and that comes to life in a turn of its own, so that a phone is never busy
 * for long. To be made once, beside the component that shows it: with new props for each drawing React would give it no turn
 * of its own.
 */
export function part(content: React.ReactElement): React.ReactElement {
  return <Activity>{content}</Activity>;
}
