"use client";

import { useRef, useState, type FormEvent } from "react";
import { forgottenAddress, newPasswordRoute, signInAddress } from "../addresses";
import { Button, LinkButton } from "../ui/Button";
import { Strip } from "../ui/Strip";
import { ask, type Answered } from "./ask";
import { DeadLink } from "./DeadLink";
import { newPasswordFault, passwordHint } from "./fieldChecks";
import { Outcome } from "./Outcome";
import { PasswordField } from "./PasswordField";

/** Opened from a link; saving ends every session and signs nobody in. */
export function NewPasswordForm({ token }: { token: string }) {
  const [password, setPassword] = useState("");
  const [fault, setFault] = useState<string>();
  const [answered, setAnswered] = useState<Answered>();
  const [busy, setBusy] = useState(false);
  const field = useRef<HTMLInputElement>(null);

  function refuse(words: string) {
    setFault(words);
    field.current?.focus();
  }

  async function submit(event: FormEvent) {
    event.preventDefault();
    if (busy) return;
    const found = newPasswordFault(password);
    setFault(undefined);
    setAnswered(undefined);
    if (found) return refuse(found);
    setBusy(true);
    const answer = await ask("POST", newPasswordRoute, { token, password });
    setBusy(false);
    setAnswered(answer);
    if (answer.kind === "invalid") refuse(answer.fields.password ?? answer.message);
  }

  if (token === "" || answered?.kind === "refused") return <DeadLink href={forgottenAddress} again="Send a new link" />;
  if (answered?.kind === "done") {
    return (
      <Outcome
        kind="note"
        heading="The new password is saved"
        action={
          <LinkButton look="ink" href={signInAddress()} className="min-h-12 w-full">
            Sign in
          </LinkButton>
        }
      >
        You are signed out on every device. Sign in with the new password.
      </Outcome>
    );
  }
  return (
    <form method="post" action={newPasswordRoute} noValidate onSubmit={submit} className="flex flex-col gap-4">
      <PasswordField
        ref={field}
        label="New password"
        what="the new password"
        name="password"
        autoComplete="new-password"
        hint={passwordHint}
        value={password}
        onType={setPassword}
        error={fault}
      />
      <p className="text-second text-ink2">Saving it signs you out on every device, also on a lost one. Then sign in with the new one.</p>
      {(answered?.kind === "fault" || answered?.kind === "wait") && (
        <Strip kind={answered.kind === "wait" ? "wait" : "error"} heading="Not saved yet">{answered.message}</Strip>
      )}
      <Button type="submit" look="ink" className="min-h-12 w-full" aria-disabled={busy || undefined}>
        {busy ? "Saving" : "Save the password"}
      </Button>
    </form>
  );
}
