import { describe, expect, it } from 'vitest';
import { displayNameField } from '@/lib/accounts/account.schema';
import { nameField } from '@/lib/gardens/garden.schema';

describe('a name', () => {
  it.each(['Skerry Point School’s kitchen-garden club', '<b>&amp; "quoted"</b>', '菜园 🌱', 'سرداب', ' trimmed '])(
    'may be %s',
    (name) => {
      expect(nameField.parse(name)).toBe(name.trim());
      expect(displayNameField.parse(name)).toBe(name.trim());
    },
  );

  it.each(['two\nlines', 'a\u0007bell', 'a\u202Eturned', 'a\u2066held', 'del\u007F'])('is refused as %j', (name) => {
    for (const field of [nameField, displayNameField]) {
      expect(field.safeParse(name).error?.issues[0]?.message).toContain('cannot be seen');
    }
  });
});
