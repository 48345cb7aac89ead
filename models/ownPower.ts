import { ownLevelsSchema, powerInRoom, powerOutdoors, type OwnLevels } from "../lib/noise/ownPower";
import type { Plan } from "../lib/noise/plan";
import { absorptionOf } from "../lib/noise/rooms";
import type { Source } from "../lib/noise/sources";
import { sourceKinds } from "../lib/noise/sources";
import { toArithmetic, type Spectrum } from "../lib/noise/spectrum";
import { fieldWords } from "./checkPart";
import { PartFault } from "./PartFault";
import type { Place } from "./partTables";
import { planOf } from "./planOf";

type Values = Record<string, unknown>;

/**
 * What was asked of a source, with the sound power behind the levels that were measured of it (`measured`). The power
 * takes the place of the library's or of typed figures, and says how it was found.
 */
export async function withOwnPower({ projectId, transaction }: Place, id: string, { measured, ...patch }: Values): Promise<Values> {
  const own = read(measured);
  const plan = await planOf(projectId, transaction);
  const source = plan.sources.find((one) => one.id === id);
  if (!source) throw new PartFault("missing", "There is no such source here.");
  refuseElsewhere(source);
  const power = powerOf(own, source, plan);
  if (power.every((level) => level === null)) throw misfit({ levels: "No band has both a level and a room that is known." });
  return { ...patch, power, deviation: null, basis: "measured", provenance: provenanceOf(own, plan) };
}

function read(measured: unknown): OwnLevels {
  const form = ownLevelsSchema.safeParse(measured);
  if (!form.success) throw misfit(fieldWords(form.error.issues));
  return form.data;
}

/** A fan is heard at the mouths of its duct and a street at the walls: neither has a power that a metre finds beside it. */
function refuseElsewhere({ kind }: Source) {
  const { placement } = sourceKinds[kind];
  if (placement === "fan" || placement === "incident") throw misfit({ kind: "The power of this kind is not found from a level beside it." });
}

function powerOf({ levels, distance, spaceId }: OwnLevels, source: Source, plan: Plan): Spectrum {
  const heard = toArithmetic(levels);
  if (spaceId === null) return toStored(powerOutdoors(heard, distance));
  const space = plan.spaces.find(({ id }) => id === spaceId);
  if (!space) throw misfit({ spaceId: "There is no such room here." });
  const q = "q" in source.params ? source.params.q : 1;
  return toStored(powerInRoom({ levels: heard, distance, q, absorption: absorptionOf(space, plan.surfaces, plan.lot) }));
}

/** To a tenth of a decibel: no meter reads finer. */
function toStored(power: Float64Array): Spectrum {
  return Array.from(power, (level) => {
    if (Number.isNaN(level)) return null;
    return level === -Infinity ? "silent" : Math.round(level * 10) / 10;
  });
}

function provenanceOf({ distance, spaceId, note }: OwnLevels, { spaces }: Plan) {
  const where = spaceId === null ? "in the open over hard ground" : `in ${spaces.find(({ id }) => id === spaceId)!.name}, with the absorption it had then`;
  return { document: "Own measurement", clause: [`${distance} m away ${where}`, note].filter(Boolean).join("; "), memory: false };
}

const misfit = (fields: Record<string, string>) => new PartFault("invalid", "This value does not fit.", fields);
