"use client";

import { Button } from "../ui/Button";

/** The yard that ships with the product, to be copied and changed. */
export function WorkedExample({ busy, onCopy }: { busy: boolean; onCopy: () => void }) {
  return (
    <section aria-labelledby="example" className="desk:max-w-[50%] rounded-sheet border border-edge p-4 mid:p-6.5">
      <h2 id="example" className="text-part">
        Start from a worked yard
      </h2>
      <p className="mb-3.5 mt-1 max-w-prose text-second text-ink2">
        An invented yard with every figure open: drums in a shed, the houses around it, and whoever hears them. Copy it and move the walls.
      </p>
      <Button aria-disabled={busy || undefined} onClick={onCopy}>
        {busy ? "Copying" : "Copy the example"}
      </Button>
    </section>
  );
}
