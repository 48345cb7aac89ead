import type { State } from "../format";

const shapes: Record<State, React.ReactNode> = {
  under: (
    <>
      <path d="M1.5 3.5h15M9 3.5v3.4" />
      <circle cx="9" cy="10.9" r="4" />
    </>
  ),
  tight: (
    <>
      <path d="M1 9h3.8M13.2 9H17" />
      <circle cx="9" cy="9" r="4.2" />
      <path d="M4.8 9a4.2 4.2 0 0 0 8.4 0z" fill="currentColor" />
    </>
  ),
  over: (
    <>
      <path d="M1.5 14.5h15" />
      <path d="M9 4.6 14 11.6H4z" fill="currentColor" strokeWidth="1.2" />
    </>
  ),
  "not weighed": (
    <>
      <path d="M1.5 3.5h15" />
      <circle cx="9" cy="10.9" r="4" strokeDasharray="2.2 2" />
    </>
  ),
};

/** A line and a bead: below it, on it, standing on it, or dashed. The word always stands beside it. */
export function StatusMark({ state, size = 18 }: { state: State; size?: number }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 18 18"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.9"
      strokeLinejoin="round"
      aria-hidden="true"
      className="block flex-none"
      data-state={state}
    >
      {shapes[state]}
    </svg>
  );
}
