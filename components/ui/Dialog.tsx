"use client";

import { useEffect, useId, useRef, type ReactNode } from "react";

interface Props {
  open: boolean;
  heading: string;
  /** Esc and every way out that is not the main action. */
  onClose: () => void;
  children: ReactNode;
  /** Main action and the way out, in reading order. */
  actions: ReactNode;
}

/** The browser's own dialog: only for deleting, signing and sharing. */
export function Dialog({ open, heading, onClose, children, actions }: Props) {
  const dialog = useRef<HTMLDialogElement>(null);
  const headingId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (!element || element.open === open) return;
    if (open) element.showModal();
    else element.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      onClose={onClose}
      aria-labelledby={headingId}
      className="m-auto w-[min(30rem,calc(100vw-24px))] rounded-sheet border border-edge bg-sheet p-6.5 text-ink"
    >
      <h2 id={headingId} className="text-section">
        {heading}
      </h2>
      <div className="mt-2 text-ink2">{children}</div>
      <div className="mt-5 flex flex-wrap gap-2">{actions}</div>
    </dialog>
  );
}
