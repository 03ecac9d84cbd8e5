/** The theme a cookie asks for; day where it asks for none we know. */
export function themeOf(cookie: string | undefined): 'day' | 'night' {
  return cookie === 'night' ? 'night' : 'day';
}
