const CODE = /^(.*?)(\d+)$/;
const FIRST_PREFIX = 'C';

/** The code that follows those of the round: the prefix of its highest number, at least two digits. */
export function nextCode(codes: readonly string[]): string {
  const parts = codes.flatMap((code) => {
    const match = CODE.exec(code);
    return match ? [{ prefix: match[1], number: Number(match[2]) }] : [];
  });
  const last = parts.reduce((highest, part) => (part.number > highest.number ? part : highest), {
    prefix: parts[0]?.prefix ?? FIRST_PREFIX,
    number: 0,
  });
  return `${last.prefix}${String(last.number + 1).padStart(2, '0')}`;
}
