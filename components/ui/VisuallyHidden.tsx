/** Words for a screen reader where the eye reads them off a drawing. */
export function VisuallyHidden({ children }: { children: React.ReactNode }) {
  return <span className="sr-only">{children}</span>;
}
