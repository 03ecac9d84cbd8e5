import type { ThrottleRule } from '@/db/stores/throttle-store';

const QUARTER_HOUR = 900;
const HOUR = 3600;

/** How often something may be tried, by account and by client address. */
export const throttleRules = {
  signInOfAccount: { name: 'sign-in-account', tries: 10, perSeconds: QUARTER_HOUR },
  signInFromAddress: { name: 'sign-in-address', tries: 60, perSeconds: QUARTER_HOUR },
  registerFromAddress: { name: 'register-address', tries: 20, perSeconds: HOUR },
  mailToAccount: { name: 'mail-account', tries: 5, perSeconds: HOUR },
  resetFromAddress: { name: 'reset-address', tries: 20, perSeconds: HOUR },
  passwordOfUser: { name: 'password-user', tries: 10, perSeconds: QUARTER_HOUR },
} as const satisfies Record<string, ThrottleRule>;
