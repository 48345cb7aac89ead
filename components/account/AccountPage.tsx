"use client";

import { Sheet } from "../ui/Sheet";
import type { AccountFacts, Device } from "./Account";
import { DevicesSheet } from "./DevicesSheet";
import { EmailChange } from "./EmailChange";
import { PasswordSheet } from "./PasswordSheet";
import { SettingsSheet } from "./SettingsSheet";

interface Props {
  facts: AccountFacts;
  devices: readonly Device[];
  now: string;
  /** Asks for the page anew: the list of devices has changed. */
  onChanged: () => void;
}

function WhoSheet({ name, email }: Pick<AccountFacts, "name" | "email">) {
  return (
    <Sheet heading="You">
      <dl className="grid gap-x-6 gap-y-3 mid:grid-cols-2">
        <div className="min-w-0">
          <dt className="text-second font-semibold text-ink2">Name</dt>
          <dd className="m-0 break-words">{name}</dd>
        </div>
        <div className="min-w-0">
          <dt className="text-second font-semibold text-ink2">E-mail</dt>
          <dd className="m-0 break-words">{email}</dd>
        </div>
      </dl>
      <EmailChange />
    </Sheet>
  );
}

/** One's own account: nothing of a yard. */
export function AccountPage({ facts, devices, now, onChanged }: Props) {
  return (
    <>
      <h1 id="account" tabIndex={-1} className="mb-4 text-verdictPhone font-[640] mid:text-head">
        Your account
      </h1>
      <div className="grid grid-cols-1 items-start gap-3 mid:gap-5 desk:grid-cols-2">
        <div className="grid grid-cols-1 gap-3 mid:gap-5">
          <WhoSheet {...facts} />
          <SettingsSheet facts={facts} />
        </div>
        <div className="grid grid-cols-1 gap-3 mid:gap-5">
          <DevicesSheet devices={devices} now={now} />
          <PasswordSheet email={facts.email} onChanged={onChanged} />
        </div>
      </div>
    </>
  );
}
