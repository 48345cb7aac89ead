"use client";

import { useEffect, useRef } from "react";
import { Button, LinkButton } from "../ui/Button";
import { Strip } from "../ui/Strip";

export type Trouble = { kind: "signedOut" } | { kind: "failed"; message: string };

interface Props {
  trouble: Trouble;
  signInHref: string;
  onRetry: () => void;
}

/** A save that did not arrive. What was typed stays where it stands; the words come into sight from any field. */
export function SaveTrouble(props: Props) {
  const place = useRef<HTMLDivElement>(null);
  useEffect(() => {
    // Some browsers answer with a promise, which is no clean-up.
    void place.current?.scrollIntoView?.({ block: "nearest" });
  }, [props.trouble]);
  return (
    <div ref={place} className="scroll-mt-28">
      <TroubleStrip {...props} />
    </div>
  );
}

function TroubleStrip({ trouble, signInHref, onRetry }: Props) {
  if (trouble.kind === "signedOut") {
    return (
      <Strip
        kind="error"
        heading="You are signed out."
        action={
          <>
            <LinkButton href={signInHref} target="_blank">
              Sign in again
            </LinkButton>
            <Button onClick={onRetry}>Save again</Button>
          </>
        }
        className="mb-5"
      >
        The change was not saved; what you typed is still here. Sign in opens beside this page: come back to it and
        save again.
      </Strip>
    );
  }
  return (
    <Strip
      kind="error"
      heading="The change was not saved."
      action={<Button onClick={onRetry}>Save again</Button>}
      className="mb-5"
    >
      {trouble.message}
    </Strip>
  );
}
