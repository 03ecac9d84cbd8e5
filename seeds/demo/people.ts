import type { BoatRole } from '@/lib/access/permissions';

/** Nobody real. The password is for the demo alone and stands in the README. */
export const demoPassword = 'two-bows-one-wind';

export const demoPeople: readonly { readonly email: string; readonly name: string; readonly role: BoatRole }[] = [
  { email: 'owner@example.org', name: 'Ottilie Brandvold', role: 'owner' },
  { email: 'skipper@example.org', name: 'Tamsin Okoro', role: 'skipper' },
  { email: 'crew@example.org', name: 'Ruben Castellane', role: 'crew' },
];
