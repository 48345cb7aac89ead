"use client";

import { useState } from "react";
import type { Space } from "@/lib/noise/plan";
import { formatNumber, withUnit } from "../format";
import { StatusMark } from "../marks/StatusMark";
import { Disclosure } from "../ui/Disclosure";
import { FoldedSheet } from "../ui/FoldedSheet";
import { NumberField } from "../ui/NumberField";
import { breathOf, carbonDioxide, flowFor, standardFlow } from "./air";
import { AirChart } from "./AirChart";
import { floorArea } from "./room";

const MINUTES = 120;
/** m3/h are written in tens, upward: a fan must not come out too small by rounding. */
const upToTen = (flow: number) => withUnit(formatNumber(Math.ceil(flow / 10) * 10), "m³/h");

/** What two hours behind a shut door do to the air, to try out. */
export function AirPanel({ space }: { space: Space }) {
  const [drumming, setDrumming] = useState(1);
  const [sitting, setSitting] = useState(1);
  const [flow, setFlow] = useState(0);
  const [aim, setAim] = useState(1400);
  const breath = breathOf({ drumming, sitting });
  const at = (minutes: number, air = flow) => carbonDioxide(minutes, { breath, flow: air, volume: space.volume });
  const highest = at(MINUTES);
  const missed = highest > aim;
  const needed = flowFor(aim, breath);
  const floor = floorArea(space);
  const people = drumming + sitting;
  return (
    <FoldedSheet
      heading="Air"
      says="To try out: nothing here is kept, and no level depends on it."
      beside={
        <p className="flex items-center gap-2 font-semibold" role="status">
          <span className={missed ? "text-over" : "text-under"}>
            <StatusMark state={missed ? "over" : "under"} />
          </span>
          {missed ? "over your aim" : "within your aim"}
        </p>
      }
      className="mb-3 mid:mb-5"
    >
      <div className="grid gap-6 desk:grid-cols-2">
        <AirChart at={at} sealed={flow > 0 ? (minutes) => at(minutes, 0) : undefined} aim={aim} minutes={MINUTES} />
        <div>
          <div className="grid grid-cols-2 gap-4">
            <NumberField label="Drumming" min={0} max={20} value={drumming} onCommit={(value) => value !== null && setDrumming(value)} />
            <NumberField label="Sitting" min={0} max={60} value={sitting} onCommit={(value) => value !== null && setSitting(value)} />
            <NumberField label="Fresh air" unit="m³/h" step={10} min={0} max={5000} value={flow} hint="Nought is the fan off and the door shut." onCommit={(value) => value !== null && setFlow(value)} />
            <NumberField label="Your aim" unit="ppm" step={100} min={500} max={5000} value={aim} hint="1 400 is common practice, no source." onCommit={(value) => value !== null && setAim(value)} />
          </div>
          <p className="mt-4 text-ink2">
            They breathe out about {withUnit(formatNumber(breath * 1000), "litres")} of carbon dioxide an hour. After two hours the room holds about {withUnit(formatNumber(Math.round(highest / 50) * 50), "ppm")}.
            {missed && needed !== null && ` To stay within your aim for good takes ${upToTen(needed)} of air from outdoors.`}
          </p>
          {floor !== null && people > 0 && (
            <p className="mt-2 text-second text-ink2">
              One standard for rooms of music and dance asks for at least {upToTen(standardFlow(people, floor))} here; it does not count on drummers. Local rules and whoever designs the ventilation decide.
            </p>
          )}
          <Disclosure summary="Where these are from" className="mt-2">
            <p>
              Somebody sitting: 0.30 litres a minute, and 400 ppm outdoors, from a textbook problem after ASHRAE 62-1999. Drumming: 6.3 to 8.1 times the body’s rate at rest, read in two studies of drummers, taken as six times somebody
              sitting, who has 1.2 (from memory: ASHRAE 62); people differ by a third and more. The standard: ANSI/ASHRAE 62.1-2016, Table 6.2.2.1, read in a copy. The curve takes the air as well mixed.
            </p>
          </Disclosure>
        </div>
      </div>
    </FoldedSheet>
  );
}
