/** What the sign-in page says of next-auth's answer. */
export function signInProblem(error: string | null): string {
  const seconds = Number(/^too-many-tries:(\d+)$/.exec(error ?? '')?.[1] ?? Number.NaN);
  if (seconds > 0) {
    return `Too many tries. Wait ${Math.ceil(seconds / 60)} min and try again, or set a new password.`;
  }
  if (error === 'CredentialsSignin') {
    return 'E-mail and password do not go together. Check both, or set a new password.';
  }
  return 'Signing in failed on our side. Try again in a minute.';
}
