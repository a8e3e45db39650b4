/** A time as it stands in a title block: `2026-03-04 15:20 UTC` of an ISO time in UTC, anything else as it is. */
export function printedTime(printedAt: string): string {
  const parts = /^(\d{4}-\d{2}-\d{2})T(\d{2}:\d{2}):\d{2}(?:\.\d+)?Z$/.exec(printedAt);
  return parts === null ? printedAt : `${parts[1] ?? ''} ${parts[2] ?? ''} UTC`;
}
