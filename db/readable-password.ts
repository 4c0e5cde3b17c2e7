import { randomInt } from 'node:crypto';

/** Letters and digits that cannot be taken for one another. */
const ALPHABET = 'abcdefghjkmnpqrstuvwxyz23456789';
const GROUPS = 4;
const GROUP_LENGTH = 5;

/** A random password that can be copied by hand: 4 × 5 signs, 99 bits. */
export function readablePassword(): string {
  const sign = () => ALPHABET[randomInt(ALPHABET.length)]!;
  const group = () => Array.from({ length: GROUP_LENGTH }, sign).join('');
  return Array.from({ length: GROUPS }, group).join('-');
}
