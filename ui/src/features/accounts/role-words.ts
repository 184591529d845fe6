import type { Role } from '@brimgate/rules';

export const roleWords: Readonly<Record<Role, string>> = {
  nutritionist: 'nutritionist',
  veterinarian: 'veterinarian',
  compliance: 'compliance',
  'yard-manager': 'yard manager',
  administrator: 'administrator',
};

/** `Tamarack Draw yard`, `3 yards`, `all yards`: where somebody works, short enough for the header. */
export function yardWords(role: Role, yards: readonly { name: string }[]): string {
  const [only] = yards;
  if (yards.length === 1 && only) return only.name;
  if (role === 'administrator') return 'all yards';
  return yards.length === 0 ? 'no yard yet' : `${yards.length} yards`;
}
