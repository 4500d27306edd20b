/** What was typed into a field of a form, without blanks around it; "" for a field that is not there. */
export function typedText(data: FormData, name: string): string {
  const value = data.get(name);
  return typeof value === 'string' ? value.trim() : '';
}
