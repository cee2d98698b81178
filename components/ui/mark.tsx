/** The mark: two rows turning round at the headland. One ink, the ink of its surroundings. */
export function Mark({ className }: { className?: string }) {
  return (
    <svg
      width="34"
      height="30"
      viewBox="0 0 34 30"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.6"
      className={className}
      aria-hidden="true"
    >
      <path d="M2 4h20a7 7 0 0 1 0 22H2" />
      <path d="M2 11.3h19.5a3.7 3.7 0 0 1 0 7.4H2" />
    </svg>
  )
}
