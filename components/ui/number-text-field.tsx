'use client';

import { TextField, type TextFieldProps } from './text-field';

/**
 * A field for a number as people type it, comma or point. It stays a text field: `type="number"` hides what it cannot
 * read, so "3,5" would be lost without a word. The caller turns the text into a number and words the problem.
 */
export function NumberTextField(props: Omit<TextFieldProps, 'type' | 'inputMode'>) {
  return <TextField autoComplete="off" {...props} type="text" inputMode="decimal" />;
}
