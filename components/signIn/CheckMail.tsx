"use client";

import { signInAddress, signUpAddress } from "../addresses";
import { LinkButton } from "../ui/Button";
import { Strip } from "../ui/Strip";
import { useHydrated } from "../ui/useHydrated";
import { readMailedTo } from "./mailedTo";

/** The same words whether the e-mail was known already or not. */
export function CheckMail() {
  const mailedTo = useHydrated() ? readMailedTo() : null;
  return (
    <div className="flex flex-col gap-4">
      <Strip kind="mail" heading={mailedTo ? <span className="break-words">A mail went to {mailedTo}</span> : "A mail went to the e-mail you typed"}>
        Its link works once, for 24 hours. Open it and press the button there.
      </Strip>
      <p className="text-second text-ink2">
        Nothing there after a few minutes? Look among the unwanted mail. Signing in with your new password sends the link once more.
      </p>
      <div className="flex flex-wrap gap-2.5">
        <LinkButton href={signInAddress()}>Sign in</LinkButton>
        <LinkButton href={signUpAddress}>The e-mail was mistyped</LinkButton>
      </div>
    </div>
  );
}
