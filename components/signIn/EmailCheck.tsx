"use client";

import { useState } from "react";
import { emailCheckRoute, signInAddress } from "../addresses";
import { Button, LinkButton } from "../ui/Button";
import { Strip } from "../ui/Strip";
import { ask, type Answered } from "./ask";
import { DeadLink } from "./DeadLink";
import { Outcome } from "./Outcome";

/** Opened from the mail: the link alone changes nothing, for mail scanners open links too. */
export function EmailCheck({ token }: { token: string }) {
  const [answered, setAnswered] = useState<Answered>();
  const [busy, setBusy] = useState(false);

  async function check() {
    if (busy) return;
    setBusy(true);
    setAnswered(await ask("POST", emailCheckRoute, { token }));
    setBusy(false);
  }

  if (token === "" || answered?.kind === "refused" || answered?.kind === "invalid") {
    return <DeadLink href={signInAddress()} again="Sign in to be sent a new link" />;
  }
  if (answered?.kind === "done") {
    return (
      <Outcome
        kind="mail"
        heading="Your e-mail is checked"
        action={
          <LinkButton look="ink" href={signInAddress()} className="min-h-12 w-full">
            Sign in
          </LinkButton>
        }
      >
        Sign in with the password you chose.
      </Outcome>
    );
  }
  return (
    <div className="flex flex-col gap-4">
      <p className="text-ink2">One press says that this e-mail is yours. Then you can sign in.</p>
      {answered && <Strip kind={answered.kind === "wait" ? "wait" : "error"} heading="Not checked yet">{answered.message}</Strip>}
      <Button look="ink" className="min-h-12 w-full" onClick={check} aria-disabled={busy || undefined}>
        {busy ? "Checking" : "This e-mail is mine"}
      </Button>
    </div>
  );
}
