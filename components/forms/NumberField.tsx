'use client'

import { TextField, type TextFieldProps } from './TextField'

export type NumberFieldProps = Omit<TextFieldProps, 'type' | 'inputMode'> & { whole?: boolean }

/** A number as text (the schema parses it), with its unit inside the field at the right. */
export function NumberField({ whole = false, width = 'short', ...rest }: NumberFieldProps) {
  return <TextField {...rest} width={width} inputMode={whole ? 'numeric' : 'decimal'} />
}
