"use client";

import { useState } from "react";
import { accountAddress, emailMoveRoute, emailUndoRoute, forgottenAddress, signInAddress } from "../addresses";
import { Button, LinkButton } from "../ui/Button";
import { Strip } from "../ui/Strip";
import { ask, type Answered } from "./ask";
import { DeadLink } from "./DeadLink";
import { Outcome } from "./Outcome";

const ways = {
  move: {
    route: emailMoveRoute,
    says: "One press moves your account to this e-mail. You sign in with it from then on.",
    act: "Move my account here",
    done: { heading: "Your account has moved", words: "Sign in with the new e-mail and the password you have." },
    otherwise: { href: accountAddress, again: "Ask for it again in your account" },
  },
  undo: {
    route: emailUndoRoute,
    says: "One press keeps your account with this e-mail, signs out every device and ends the password.",
    act: "Keep my account here",
    done: { heading: "Your account stays here", words: "A mail with a link to a new password is on its way to you." },
    otherwise: { href: forgottenAddress, again: "Make a new password" },
  },
};

/** Opened from the mail: the link alone changes nothing, for mail scanners open links too. */
export function EmailMove({ way, token }: { way: keyof typeof ways; token: string }) {
  const { route, says, act, done, otherwise } = ways[way];
  const [answered, setAnswered] = useState<Answered>();
  const [busy, setBusy] = useState(false);

  async function use() {
    if (busy) return;
    setBusy(true);
    setAnswered(await ask("POST", route, { token }));
    setBusy(false);
  }

  if (token === "" || answered?.kind === "refused" || answered?.kind === "invalid") return <DeadLink {...otherwise} />;
  if (answered?.kind === "done") {
    const onward = (
      <LinkButton look="ink" href={signInAddress()} className="min-h-12 w-full">
        Sign in
      </LinkButton>
    );
    return (
      <Outcome kind="mail" heading={done.heading} action={onward}>
        {done.words}
      </Outcome>
    );
  }
  return (
    <div className="flex flex-col gap-4">
      <p className="text-ink2">{says}</p>
      {answered && <Strip kind={answered.kind === "wait" ? "wait" : "error"} heading="Not done yet">{answered.message}</Strip>}
      <Button look="ink" className="min-h-12 w-full" onClick={use} aria-disabled={busy || undefined}>
        {busy ? "One moment" : act}
      </Button>
    </div>
  );
}
