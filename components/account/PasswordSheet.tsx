"use client";

import { useRef, useState, type FormEvent } from "react";
import { passwordRoute } from "../addresses";
import { ask, type Answered } from "../signIn/ask";
import { newPasswordFault, passwordHint } from "../signIn/fieldChecks";
import { PasswordField } from "../signIn/PasswordField";
import { useWait } from "../signIn/useWait";
import { waitReason, WaitRule } from "../signIn/WaitRule";
import { Button } from "../ui/Button";
import { Sheet } from "../ui/Sheet";
import { Strip } from "../ui/Strip";

const FIELDS = ["current", "password"] as const;
type Faults = Partial<Record<(typeof FIELDS)[number], string>>;

interface Props {
  email: string;
  /** All other devices were signed out. */
  onChanged: () => void;
}

export function PasswordSheet({ email, onChanged }: Props) {
  const [typed, setTyped] = useState({ current: "", password: "" });
  const [faults, setFaults] = useState<Faults>({});
  const [answered, setAnswered] = useState<Answered>();
  const [busy, setBusy] = useState(false);
  const [wait, beginWait, forgetWait] = useWait();
  const form = useRef<HTMLFormElement>(null);

  function show(found: Faults) {
    setFaults(found);
    const first = FIELDS.find((field) => found[field]);
    form.current?.querySelector<HTMLInputElement>(`[name="${first}"]`)?.focus();
  }

  function receive(answer: Answered) {
    setBusy(false);
    setAnswered(answer);
    if (answer.kind === "wait") beginWait(answer.seconds, answer.message);
    if (answer.kind === "invalid") show(FIELDS.some((field) => answer.fields[field]) ? answer.fields : { password: answer.message });
    if (answer.kind !== "done") return;
    setTyped({ current: "", password: "" });
    onChanged();
  }

  async function submit(event: FormEvent) {
    event.preventDefault();
    if (busy || wait.left > 0) return;
    const current = typed.current === "" ? "Type the password you have now." : undefined;
    const password = newPasswordFault(typed.password);
    show({ current, password });
    setAnswered(undefined);
    forgetWait();
    if (current || password) return;
    setBusy(true);
    receive(await ask("POST", passwordRoute, typed));
  }

  return (
    <Sheet heading="Password">
      <form ref={form} method="post" action={passwordRoute} noValidate onSubmit={submit} className="flex flex-col gap-4">
        {/* Tells a password manager whose password it is. */}
        <input type="text" name="username" autoComplete="username" defaultValue={email} readOnly hidden />
        <PasswordField label="Password you have now" what="the password you have now" name="current" autoComplete="current-password" value={typed.current} onType={(current) => setTyped({ ...typed, current })} error={faults.current} />
        <PasswordField label="New password" what="the new password" name="password" autoComplete="new-password" hint={passwordHint} value={typed.password} onType={(password) => setTyped({ ...typed, password })} error={faults.password} />
        <WaitRule wait={wait} />
        {answered?.kind === "done" && (
          <Strip kind="note" heading="Your password is changed">
            All other devices are signed out, and a mail to you says so.
          </Strip>
        )}
        {(answered?.kind === "fault" || answered?.kind === "refused") && (
          <Strip kind="error" heading="Not changed yet">{answered.message || "Try again in a few seconds."}</Strip>
        )}
        <div>
          <Button type="submit" look="ink" aria-disabled={busy || undefined} reason={waitReason(wait)}>
            {busy ? "Changing" : "Change the password"}
          </Button>
        </div>
      </form>
    </Sheet>
  );
}
