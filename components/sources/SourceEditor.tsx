"use client";

import type { Source } from "@/lib/noise/sources";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { FoldedSheet } from "../ui/FoldedSheet";
import { ArrivingLevels } from "./ArrivingLevels";
import { BareEars } from "./BareEars";
import { placementOf, type SourceDesk } from "./desk";
import { FanMouths } from "./FanMouths";
import { HoursFields } from "./HoursFields";
import { Levels } from "./Levels";
import { OwnMeasurement } from "./OwnMeasurement";
import { SourceFields } from "./SourceFields";
import { SourceLibrary } from "./SourceLibrary";

interface Props {
  desk: SourceDesk;
  source: Source;
  onRemove: () => void;
}

/** Everything of the lit source: its levels, what it is and where, and where other figures may come from. */
export function SourceEditor({ desk, source, onRemove }: Props) {
  const placement = placementOf(desk, source.kind);
  const arriving = placement === "incident";
  return (
    <>
      <div className="mb-5 rounded-sheet bg-sheet desk:grid desk:grid-cols-[minmax(0,1fr)_minmax(260px,336px)]">
        <section id="lit-source" tabIndex={-1} aria-label={source.name} className="min-w-0 p-4 mid:p-6.5 desk:border-r desk:border-rule">
          {arriving ? <ArrivingLevels desk={desk} source={source} /> : <Levels desk={desk} source={source} />}
          <BareEars desk={desk} source={source} />
        </section>
        <div className="grid content-start gap-6 border-t border-rule p-4 mid:p-6.5 desk:border-t-0">
          <SourceFields desk={desk} source={source} />
          {!desk.locked && <HoursFields desk={desk} source={source} />}
          {!desk.locked && (
            <div>
              <Button icon={<Icon name="remove" size={18} />} onClick={onRemove}>
                Remove this source
              </Button>
              {desk.save.errorOf(`remove ${source.id}`) && <p className="mt-2 text-second font-semibold text-over">{desk.save.errorOf(`remove ${source.id}`)}</p>}
            </div>
          )}
        </div>
      </div>
      {!arriving && (
        <div className="mb-5 rounded-sheet bg-sheet desk:grid desk:grid-cols-[minmax(0,1.35fr)_minmax(0,1fr)]">
          <FoldedSheet heading="Library" says="± is the doubt at its loudest band." className="desk:border-r desk:border-rule">
            <SourceLibrary desk={desk} source={source} />
          </FoldedSheet>
          {placement === "fan" && (
            <FoldedSheet heading="Mouths of its duct" className="border-t border-rule desk:border-t-0">
              <FanMouths desk={desk} source={source} />
            </FoldedSheet>
          )}
          {!desk.locked && placement !== "fan" && (
            <FoldedSheet heading="Your own measurement" says="Levels beside it become its power. Nothing is used until you say so." className="border-t border-rule desk:border-t-0">
              <OwnMeasurement desk={desk} source={source} />
            </FoldedSheet>
          )}
        </div>
      )}
    </>
  );
}
