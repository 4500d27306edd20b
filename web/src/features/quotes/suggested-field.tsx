import { useId } from 'react';
import type { ComponentProps } from 'react';
import { TextField } from '../../ui/field';

/** A text field that offers values and takes any other. */
export function SuggestedField({
  suggestions,
  ...field
}: ComponentProps<typeof TextField> & { suggestions: readonly string[] }) {
  const listId = useId();
  return (
    <>
      <TextField {...field} list={listId} autoComplete="off" />
      <datalist id={listId}>
        {suggestions.map((value) => (
          <option key={value} value={value} />
        ))}
      </datalist>
    </>
  );
}
