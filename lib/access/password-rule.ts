export const PASSWORD_MIN_LENGTH = 12;
export const PASSWORD_MAX_LENGTH = 200;

/** What is wrong with a new password, in words; null where nothing is. */
export function passwordProblem(password: string, email: string): string | null {
  if (password.length < PASSWORD_MIN_LENGTH) {
    return `Password: give at least ${PASSWORD_MIN_LENGTH} characters. A few words in a row are fine.`;
  }
  if (password.length > PASSWORD_MAX_LENGTH) return `Password: give at most ${PASSWORD_MAX_LENGTH} characters.`;
  if (password.trim().toLowerCase() === email.trim().toLowerCase()) {
    return 'Password: your e-mail address is the first thing tried. Choose something else.';
  }
  return null;
}
