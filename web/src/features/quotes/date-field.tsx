import { useState } from 'react';
import type { ComponentProps } from 'react';
import { formatDate } from '../../lib/dates';
import { TextField } from '../../ui/field';

/** A calendar date. Browsers write it in their own order of day and month, so it is said once more in words. */
export function DateField({ help, defaultValue, ...field }: ComponentProps<typeof TextField>) {
  const [date, setDate] = useState(String(defaultValue ?? ''));
  return (
    <TextField
      {...field}
      type="date"
      value={date}
      onChange={({ target }) => setDate(target.value)}
      help={date ? `Read as ${formatDate(date)}` : help}
    />
  );
}
