import Link from "next/link";
import type { ReactNode } from "react";

/** A way on beside the form, large enough to hit. */
export function WayOn({ href, before, children }: { href: string; before?: string; children: ReactNode }) {
  return (
    <p className="flex min-h-10 flex-wrap items-center gap-x-1.5">
      {before}
      <Link href={href} className="inline-flex min-h-6 items-center underline">
        {children}
      </Link>
    </p>
  );
}
