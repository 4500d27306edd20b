import { compare, hash } from 'bcryptjs';

/** bcrypt reads no further than this many bytes. */
const LONGEST_PASSWORD_BYTES = 72;
const COST = 12;

// Compared when the account is unknown, so that both answers take the same time.
const nobody = hash('nobody signs in with this', COST);

function passwordTooLong(password: string): boolean {
  return Buffer.byteLength(password, 'utf8') > LONGEST_PASSWORD_BYTES;
}

export async function passwordMatches(password: string, passwordHash: string | undefined): Promise<boolean> {
  const same = await compare(password, passwordHash ?? (await nobody));
  return same && passwordHash !== undefined && !passwordTooLong(password);
}
