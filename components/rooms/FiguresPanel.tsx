"use client";

import type { Space } from "@/lib/noise/plan";
import type { SpaceVerdict } from "@/lib/noise/verdict";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { Checkbox } from "../ui/Checkbox";
import { Disclosure } from "../ui/Disclosure";
import { NineBandRow } from "../ui/NineBandRow";
import { Select } from "../ui/Select";
import { FiguresRow } from "./FiguresRow";
import type { BySurfaces, Room } from "./room";
import { changeRoom, FIGURE_BOUNDS, ownFigures } from "./roomChanges";

interface Props {
  room: Room;
  judged: SpaceVerdict | undefined;
  save: PlanSave;
  litBand: number;
  onLightBand: (band: number) => void;
  /** Back to the surfaces that stand. */
  onSurfaces: () => void;
}

/** The nine figures behind the finish: reckoned from the surfaces, or typed. */
export function FiguresPanel(props: Props) {
  const { room, judged } = props;
  const { absorption } = room.space;
  return (
    <Disclosure summary="The nine figures" open={absorption.kind !== "surfaces"} key={`${room.space.id} ${absorption.kind}`}>
      {absorption.kind === "surfaces" ? <Reckoned {...props} absorption={absorption} /> : <Typed {...props} />}
      <FiguresRow judged={judged} litBand={props.litBand} />
    </Disclosure>
  );
}

function Reckoned({ room: { space }, save, absorption }: Props & { absorption: BySurfaces }) {
  const change = (patch: Partial<BySurfaces>) => void save.save(changeRoom(space, { absorption: { ...absorption, ...patch } }), `${space.id} model`);
  return (
    <div className="mb-3 grid items-end gap-4 mid:grid-cols-2">
      <Select
        label="Reckoned after"
        choices={[
          { value: "sabine", label: "Sabine: sum of the surfaces" },
          { value: "eyring", label: "Eyring: for well damped rooms" },
        ]}
        value={absorption.model}
        error={save.errorOf(`${space.id} model`)}
        onChange={(event) => change({ model: event.target.value as BySurfaces["model"] })}
      />
      <Checkbox label="The air takes its part" hint="Matters at 4 kHz and above." checked={absorption.air} onChange={(event) => change({ air: event.target.checked })} />
    </div>
  );
}

const kinds = [
  { value: "decay", label: "Decay times" },
  { value: "area", label: "Absorption areas" },
];

/** Own figures; those in the other form follow from them and stand below. */
function Typed({ room, judged, save, litBand, onLightBand, onSurfaces }: Props) {
  const { space, surfaces } = room;
  const spot = `${space.id} figures`;
  const store = (absorption: Space["absorption"]) => void save.save(changeRoom(space, { absorption }), spot);
  const { absorption } = space;
  if (absorption.kind === "surfaces") return null;
  const byDecay = absorption.kind === "decay";
  return (
    <div className="mb-4">
      <Select
        label="You give"
        className="mb-4"
        choices={kinds}
        value={absorption.kind}
        onChange={(event) => store(ownFigures(event.target.value as "decay" | "area", judged))}
      />
      <NineBandRow
        key={`${space.id} ${absorption.kind}`}
        label={byDecay ? "Decay time" : "Absorption area"}
        unit={byDecay ? "s" : "m²"}
        values={byDecay ? absorption.seconds : absorption.area}
        min={FIGURE_BOUNDS[absorption.kind][0]}
        max={FIGURE_BOUNDS[absorption.kind][1]}
        step={byDecay ? 0.05 : 0.5}
        lit={litBand}
        onLight={onLightBand}
        hint={
          byDecay
            ? "Time to fall by 60 dB, as measured in the room. Leave a band empty where you do not know it: it is then not weighed."
            : "Empty below 125 Hz counts as at 125 Hz, empty above 4 kHz as at 4 kHz."
        }
        error={save.errorOf(spot)}
        onCommit={(values) => {
          const figures = values.map((value) => (typeof value === "number" ? value : null)); // silence is no time and no area
          store(byDecay ? { kind: "decay", seconds: figures } : { kind: "area", area: figures });
        }}
      />
      {surfaces.length > 0 && (
        <Button className="mt-3" onClick={onSurfaces}>
          Use the surfaces again
        </Button>
      )}
    </div>
  );
}
