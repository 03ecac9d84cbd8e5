import type { Mail } from '@/lib/usecases/context';

/** Minutes for which a reset link works. */
export const RESET_MINUTES = 60;

/** Hours for which the first link of a new account works. */
export const WELCOME_HOURS = 24;

export function welcomeMail({ email, token }: { email: string; token: string }, origin: string): Mail {
  return {
    to: email,
    subject: 'Your Twobow account',
    text: paragraphs(
      'Somebody registered with this e-mail address. Was it you? Then choose a password:',
      `${origin}/reset/${token}`,
      `The link works once and for ${WELCOME_HOURS} hours; register again for a new one. Was it not you? Then there is nothing to do: nobody can sign in.`,
    ),
  };
}

export function accountExistsMail({ email }: { email: string }, origin: string): Mail {
  return {
    to: email,
    subject: 'Your Twobow account',
    text: paragraphs(
      'Somebody tried to register with this e-mail address. It has an account already, and nothing was changed.',
      `Was it you? Sign in: ${origin}/sign-in`,
      `Or set a new password: ${origin}/forgot`,
      'Was it not you? Then there is nothing to do.',
    ),
  };
}

export function resetMail({ email, token }: { email: string; token: string }, origin: string): Mail {
  return {
    to: email,
    subject: 'Set a new Twobow password',
    text: paragraphs(
      'Somebody asked for a new password for this e-mail address. Was it you? Then open:',
      `${origin}/reset/${token}`,
      `The link works once and for ${RESET_MINUTES} minutes. Was it not you? Then there is nothing to do.`,
    ),
  };
}

export function passwordChangedMail({ email }: { email: string }, origin: string): Mail {
  return {
    to: email,
    subject: 'Your Twobow password was changed',
    text: paragraphs(
      'The password of your account was changed, and every session was ended.',
      `Was it not you? Then set a new one at once: ${origin}/forgot`,
    ),
  };
}

function paragraphs(...parts: string[]): string {
  return `${parts.join('\n\n')}\n`;
}
