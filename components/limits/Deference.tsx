import { Icon } from "../marks/Icon";

/** Where the product stops. */
export function Deference() {
  return (
    <div className="flex gap-3 rounded-control border border-ink p-4">
      <Icon name="note" />
      <div className="min-w-0">
        <h3 className="text-part">A limit is only as good as its clause</h3>
        <p className="mt-1 text-second text-ink2">
          No town’s code is kept here. Your local code, permit or lease decides what applies, at which hours and where it is measured; ask whoever enforces it, and read the text. Stillyard weighs; it does not interpret. Under the limit does not mean unheard.
        </p>
      </div>
    </div>
  );
}
