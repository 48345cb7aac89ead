import { bridgedLeaf, lineImpedance } from "../../lib/noise/transmission/bridge";
import type { Description } from "../../lib/noise/transmission";
import { leafOf, totalLossFactor, type Leaf } from "../../lib/noise/transmission/leaf";
import { DEFAULT_PANEL, diffuseWindow } from "../../lib/noise/transmission/panel";
import { freeRadiation, resonantTransmission } from "../../lib/noise/transmission/resonant";
import { leafTransmission } from "../../lib/noise/transmission/stack";
import { studStiffness } from "../../lib/noise/transmission/studs";
import { modelOf } from "../../lib/noise/transmission/modelOf";

/** The quantities that the worked examples print on the way, by the name they bear in the truth file. */
export function printedNumbers(description: Description, frequency: number): Record<string, number> {
  const { facts, partsAt } = modelOf(description);
  const { air, bridge, cap } = partsAt(frequency);
  const tau = air + bridge + cap;
  const ofKind = description.kind === "single" ? singleNumbers : doubleNumbers;
  const numbers: Record<string, number> = {
    air,
    bridge,
    tau,
    loss: -10 * Math.log10(tau),
    ...ofKind(description, frequency),
  };
  facts.leaves.forEach((leaf, i) => {
    numbers[`mass${i + 1}`] = leaf.mass;
    numbers[`criticalFrequency${i + 1}`] = leaf.criticalFrequency;
    numbers[`eta${i + 1}`] = leaf.eta;
  });
  if (facts.massAirMass !== undefined) numbers.massAirMass = facts.massAirMass;
  if (facts.studResonance !== undefined) numbers.studResonance = facts.studResonance;
  return numbers;
}

function singleNumbers(description: Description, frequency: number): Record<string, number> {
  if (description.kind !== "single" || !description.size)
    throw new Error("the example is one leaf with a size");
  const leaf = leafOf(description.leaf);
  const { q, p, h, meanEfficiency, ...rest } = diffuseWindow(description.size, frequency);
  return {
    q,
    p,
    h,
    meanEfficiency,
    totalLossFactor: totalLossFactor(leaf, frequency),
    forced: leafTransmission(leaf, frequency, { q, p, h, meanEfficiency, ...rest }),
    freeRadiation: freeRadiation(description.size, leaf.criticalFrequency, frequency),
    resonant: resonantTransmission(leaf, description.size, frequency),
  };
}

function doubleNumbers(description: Description, frequency: number): Record<string, number> {
  if (description.kind !== "double") throw new Error("the example has two leaves");
  const window = diffuseWindow(description.size ?? DEFAULT_PANEL, frequency);
  const bridged = (leaf: Leaf) =>
    bridgedLeaf(leaf, leafTransmission(leaf, frequency, window), frequency, window);
  const [one, two] = [leafOf(description.leaf1), leafOf(description.leaf2)];
  const numbers: Record<string, number> = {
    drive1: bridged(one).drive,
    drive2: bridged(two).drive,
    lineImpedance1: lineImpedance(bridged(one), frequency),
  };
  const { connection } = description;
  if (connection?.kind === "wood_stud") numbers.studStiffness = studStiffness(one, two, connection.spacing);
  return numbers;
}
