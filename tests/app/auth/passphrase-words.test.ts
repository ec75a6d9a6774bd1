import { describe, expect, it } from 'vitest';
import { passphraseWords, suggestPassphrase } from '@/app/(auth)/_components/passphrase-words';
import { passphraseField } from '@/lib/accounts/account.schema';

describe('a suggested passphrase', () => {
  it('is drawn from a list without doubles, so that each word is as likely as another', () => {
    expect(new Set(passphraseWords).size).toBe(passphraseWords.length);
    expect(passphraseWords.every((word) => /^[a-z]{3,8}$/.test(word))).toBe(true);
  });

  it('holds at least 44 bits of chance', () => {
    expect(6 * Math.log2(passphraseWords.length)).toBeGreaterThan(44);
    expect(suggestPassphrase().split(' ')).toHaveLength(6);
  });

  it('is always long enough for the rule it is measured by', () => {
    for (let i = 0; i < 200; i += 1) expect(passphraseField.safeParse(suggestPassphrase()).success).toBe(true);
  });
});
