import { compare, hash } from 'bcryptjs';

/** 2^11 rounds: above the 2^10 that OWASP's Password Storage Cheat Sheet asks for at least. */
const COST = 11;

/** Of no password anybody has, so that an unknown address takes as long to refuse as a wrong password. */
const NOBODYS_HASH = '$2b$11$C6UzMDM.H6dfI/f/IKcEeO7ZSGVvNpfmn/H5RZQzqZl1Yo9rWZpmu';

export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

/** @param storedHash - null for an unknown person; the answer is then false, after the same time */
export async function passwordFits(password: string, storedHash: string | null): Promise<boolean> {
  const fits = await compare(password, storedHash ?? NOBODYS_HASH);
  return fits && storedHash !== null;
}
