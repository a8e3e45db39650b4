const longest = 60;

/** Text as it stands in a message: in double quotes, on one line, cut after 60 characters. */
export function quoteText(text: string): string {
  const line = text.replace(/[\s\p{Cc}\p{Cs}]+/gu, ' ');
  return line.length > longest ? `"${line.slice(0, longest)}..."` : `"${line}"`;
}
