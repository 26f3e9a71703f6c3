/** The mark: a lid over a second arc over the ground. */
export function Mark({ size = 26 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 26 26" fill="none" strokeLinecap="round" aria-hidden="true">
      <path d="M3 9.5C9 5 17 5 23 9.5" stroke="var(--chakra-colors-lid)" strokeWidth="3" />
      <path
        d="M6 14.5c4.5-2.6 9.5-2.6 14 0"
        stroke="var(--chakra-colors-air)"
        strokeWidth="2.4"
        opacity="0.75"
      />
      <path d="M3 21h20" stroke="var(--chakra-colors-ground)" strokeWidth="3" />
    </svg>
  );
}
