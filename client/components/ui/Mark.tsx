/** Three strokes, each longer toward the bottom. */
export function Mark({ size }: { readonly size: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" fill="currentColor" aria-hidden="true">
      <path d="M2 4h7v3H2zM2 10h13v4H2zM2 17h20v5H2z" />
    </svg>
  );
}
