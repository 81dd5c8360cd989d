import { TextField, type TextFieldProps } from '@/components/ui/text-field';

/** The address somebody signs in with: the right keys on a phone, and what the browser knows filled in. */
export function EmailField(props: Pick<TextFieldProps, 'label' | 'hint' | 'problem' | 'value' | 'onChange'>) {
  return <TextField {...props} name="email" type="email" autoComplete="email" inputMode="email" />;
}
