/** When something changed, as a person would say it: minutes today, then yesterday, then the date. */
export function sayWhen(iso: string, now: Date): string {
  const then = new Date(iso);
  if (Number.isNaN(then.getTime())) return '–';
  const minutes = Math.floor((now.getTime() - then.getTime()) / 60_000);
  if (minutes < 1) return 'just now';
  if (minutes < 60) return `${minutes} min ago`;
  const dayOf = (date: Date) => new Date(date.getFullYear(), date.getMonth(), date.getDate()).getTime();
  const days = Math.round((dayOf(now) - dayOf(then)) / 86_400_000);
  if (days <= 0)
    return `today, ${then.toLocaleTimeString('en-US', { hour: '2-digit', minute: '2-digit', hour12: false })}`;
  if (days === 1) return 'yesterday';
  const year = then.getFullYear() === now.getFullYear() ? {} : { year: 'numeric' as const };
  return then.toLocaleDateString('en-US', { month: 'short', day: 'numeric', ...year });
}
