/** How long a hidden boat or passage can be brought back, days. */
export const UNDO_DAYS = 30;

/** Things hidden after this instant can still be brought back. */
export function undoSince(now: Date): Date {
  return new Date(now.getTime() - UNDO_DAYS * 86_400_000);
}
