/** A wide-flange column seen end on. */
export function Mark({ className = 'h-5 w-5' }: { className?: string }) {
  return (
    <svg viewBox="0 0 20 20" className={className} aria-hidden="true" fill="currentColor">
      <path d="M1 0h18v4.600h-2.600L15 3.400h-2.800v13.200H15l1.400-1.200H19V20H1v-4.600h2.600L5 16.600h2.800V3.400H5L3.600 4.600H1z" />
    </svg>
  );
}
