"use client";

import { useId, useState, type FormEvent } from "react";
import { proofRoute } from "../addresses";
import { ask, type Answered } from "../signIn/ask";
import { PasswordField } from "../signIn/PasswordField";
import { Button } from "../ui/Button";
import { Dialog } from "../ui/Dialog";
import { Strip } from "../ui/Strip";

interface Props {
  open: boolean;
  /** What is about to be done: "end Firefox on Linux". */
  about: string;
  onProved: () => void;
  onClose: () => void;
}

function faultOf(answered: Answered | undefined): string | undefined {
  return answered?.kind === "invalid" ? (answered.fields.password ?? answered.message) : undefined;
}

/** The password again, before what a stranger at this device must not do. */
export function PasswordAgain({ open, about, onProved, onClose }: Props) {
  const [password, setPassword] = useState("");
  const [missing, setMissing] = useState(false);
  const [answered, setAnswered] = useState<Answered>();
  const [busy, setBusy] = useState(false);
  const form = useId();

  function close() {
    setPassword("");
    setAnswered(undefined);
    setMissing(false);
    onClose();
  }

  async function submit(event: FormEvent) {
    event.preventDefault();
    if (busy) return;
    setMissing(password === "");
    if (password === "") return;
    setBusy(true);
    const answer = await ask("POST", proofRoute, { password });
    setBusy(false);
    setAnswered(answer);
    if (answer.kind !== "done") return;
    setPassword("");
    onProved();
  }

  const strip = answered && (answered.kind === "wait" || answered.kind === "fault" || answered.kind === "refused") ? answered : undefined;
  return (
    <Dialog
      open={open}
      heading="Your password again"
      onClose={close}
      actions={
        <>
          <Button type="submit" form={form} look="ink" aria-disabled={busy || undefined}>
            Go on
          </Button>
          <Button onClick={close}>Not now</Button>
        </>
      }
    >
      <form id={form} method="post" action={proofRoute} noValidate onSubmit={submit} className="flex flex-col gap-4">
        <p>You are about to {about}. The password is good for 10 minutes, then asked again.</p>
        <PasswordField label="Password" name="password" autoComplete="current-password" value={password} onType={setPassword} error={missing ? "Type your password." : faultOf(answered)} />
        {strip && <Strip kind={strip.kind === "wait" ? "wait" : "error"} heading="Not taken yet">{strip.message}</Strip>}
      </form>
    </Dialog>
  );
}
