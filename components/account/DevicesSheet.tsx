"use client";

import { useRef, useState } from "react";
import { deviceRoute, sessionsRoute } from "../addresses";
import { momentWords } from "../moments";
import { Icon } from "../marks/Icon";
import { ask, type Answered } from "../signIn/ask";
import { Button } from "../ui/Button";
import { Sheet } from "../ui/Sheet";
import { Strip } from "../ui/Strip";
import { Tag } from "../ui/Tag";
import { useHydrated } from "../ui/useHydrated";
import type { Device } from "./Account";
import { useProof } from "./useProof";

interface Props {
  devices: readonly Device[];
  /** When the list was read, as an ISO text. */
  now: string;
}

/** The clock of the reader's device; before scripts run, that of Greenwich, and said. */
function useMoments(now: string): (iso: string) => string {
  const hydrated = useHydrated();
  const zone = hydrated ? Intl.DateTimeFormat().resolvedOptions().timeZone : "UTC";
  return (iso) => `${momentWords(iso, now, zone)}${hydrated ? "" : " UTC"}`;
}

/** Ended meanwhile is as good as ended now. */
const isEnded = (answered: Answered | undefined): boolean =>
  answered?.kind === "done" || (answered?.kind === "refused" && answered.status === 404);

function DeviceLine({ one, moment, onEnd }: { one: Device; moment: (iso: string) => string; onEnd: () => void }) {
  return (
    <li className="flex min-h-14 flex-wrap items-center justify-between gap-x-4 gap-y-1 border-rule py-2.5 not-first:border-t">
      <span className="min-w-0">
        <span className="block font-semibold">{one.device}</span>
        <span className="block text-second text-ink2">
          {one.current ? "now" : `last seen ${moment(one.seenAt)}`}, signed in {moment(one.beganAt)}
        </span>
      </span>
      {one.current ? (
        <Tag icon={<Icon name="tick" size={16} />}>here</Tag>
      ) : (
        <Button onClick={onEnd} aria-label={`End ${inSentence(one.device)}, last seen ${moment(one.seenAt)}`}>
          End it
        </Button>
      )}
    </li>
  );
}

/** Where the reader is signed in; a lost device is ended from here, at once. */
export function DevicesSheet({ devices, now }: Props) {
  const [ended, setEnded] = useState<ReadonlySet<string>>(new Set());
  const [says, setSays] = useState("");
  const [trouble, setTrouble] = useState<string>();
  const [prove, dialog] = useProof();
  const place = useRef<HTMLParagraphElement>(null);
  const moment = useMoments(now);
  const live = devices.filter(({ key }) => !ended.has(key));
  const others = live.filter(({ current }) => !current);

  async function end(about: string, gone: readonly Device[], route: string) {
    setSays("");
    setTrouble(undefined);
    const answered = await prove(about, () => ask("DELETE", route));
    if (!answered) return;
    if (!isEnded(answered)) return setTrouble((answered.kind !== "done" && answered.message) || "Try again in a few seconds.");
    setEnded((before) => new Set([...before, ...gone.map(({ key }) => key)]));
    setSays(gone.length === 1 ? `Ended: ${inSentence(gone[0]!.device)}.` : "All others are ended.");
    // The pressed button is gone with its line.
    place.current?.focus();
  }

  return (
    <Sheet heading="Where you are signed in" says="a device that is ended has to sign in again">
      <ul>
        {live.map((one) => (
          <DeviceLine key={one.key} one={one} moment={moment} onEnd={() => end(`end ${inSentence(one.device)}`, [one], deviceRoute(one.key))} />
        ))}
      </ul>
      <p ref={place} tabIndex={-1} role="status" className="min-h-5 text-second text-ink2">
        {says}
      </p>
      {trouble && <Strip kind="error" heading="Not ended yet" className="mt-2">{trouble}</Strip>}
      {others.length > 1 && (
        <Button className="mt-3" onClick={() => end("end all other devices", others, sessionsRoute)}>
          End all others
        </Button>
      )}
      {dialog}
    </Sheet>
  );
}

const inSentence = (device: string) => device.charAt(0).toLowerCase() + device.slice(1);
