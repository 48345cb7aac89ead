/** The first stop of the Tab key; seen only when it is reached. */
export function SkipLink({ to, children }: { to: string; children: React.ReactNode }) {
  return (
    <a
      href={to}
      className="screen-only absolute left-3 top-2 z-30 -translate-y-20 rounded-control bg-ink px-4 py-2.5 font-semibold text-sheet no-underline focus:translate-y-0"
    >
      {children}
    </a>
  );
}
