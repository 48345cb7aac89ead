import { bridgedLeaf, bridgeTransmission } from "./bridge";
import { capOfDouble, capOfSingle } from "./caps";
import { energyOf } from "../levels";
import type { Connection, Description, DoubleDescription } from "./description";
import { cavityLayers, type Cavity } from "./fluid";
import { leafOf, type Leaf } from "./leaf";
import { DEFAULT_PANE, DEFAULT_PANEL, diffuseWindow, type Size } from "./panel";
import { resonantTransmission } from "./resonant";
import { leafTransmission, stackTransmission } from "./stack";
import { bridgeShare, massAirMass, studResonance, studSpring, studStiffness } from "./studs";

/** What a drawing or a sentence may say of a construction. Mass kg/m², thickness m, frequencies Hz, cap dB. */
export type TransmissionFacts = {
  readonly surfaceMass: number;
  /** Absent when a leaf is known only by its mass. */
  readonly thickness?: number;
  readonly leaves: readonly {
    readonly mass: number;
    readonly criticalFrequency: number;
    readonly eta: number;
  }[];
  readonly massAirMass?: number;
  readonly studResonance?: number;
  readonly cap: number;
  /** Below this frequency the values are estimated, from it on calculated. */
  readonly estimatedBelow: number;
};

/** The parts of a transmission coefficient at one frequency; equation 2.1 of the solver method. */
export type TransmissionParts = { readonly air: number; readonly bridge: number; readonly cap: number };

/** A construction ready to be asked: its facts, and its transmission at any single frequency in Hz. */
export type Model = {
  readonly facts: TransmissionFacts;
  partsAt(frequency: number): TransmissionParts;
};

const ESTIMATED_BELOW = 50;

/** Builds the model of a checked description. Solver method, section 2. */
export function modelOf(description: Description): Model {
  if (description.kind === "double") return doubleModel(description);
  const leaf = leafOf(description.leaf);
  const size = description.size ?? (leaf.isGlass ? DEFAULT_PANE : DEFAULT_PANEL);
  const facts = factsOf([leaf], 0, capOfSingle(leaf));
  return { facts, partsAt: (frequency) => singleParts(leaf, size, frequency, facts.cap) };
}

function factsOf(leaves: readonly Leaf[], cavity: number, cap: number): TransmissionFacts {
  const thickness = leaves.reduce((sum, leaf) => sum + (leaf.thickness ?? NaN), cavity);
  return {
    surfaceMass: leaves.reduce((sum, { mass }) => sum + mass, 0),
    ...(!Number.isNaN(thickness) && { thickness }),
    leaves: leaves.map(({ mass, criticalFrequency, eta }) => ({ mass, criticalFrequency, eta })),
    cap,
    estimatedBelow: ESTIMATED_BELOW,
  };
}

function singleParts(leaf: Leaf, size: Size, frequency: number, cap: number): TransmissionParts {
  const forced = leafTransmission(leaf, frequency, diffuseWindow(size, frequency));
  return { air: forced + resonantTransmission(leaf, size, frequency), bridge: 0, cap: energyOf(-cap) };
}

type Frame = { leaf1: Leaf; leaf2: Leaf; cavity: Cavity; connection: Connection; size: Size; cap: number };

function frameOf({ leaf1, leaf2, cavity, fill, flow_resistivity, ...rest }: DoubleDescription): Frame {
  return {
    leaf1: leafOf(leaf1),
    leaf2: leafOf(leaf2),
    cavity: { depth: cavity, fill, flowResistivity: flow_resistivity },
    connection: rest.connection ?? { kind: "none" },
    size: rest.size ?? (rest.use === "window" ? DEFAULT_PANE : DEFAULT_PANEL),
    cap: capOfDouble(cavity, rest.use),
  };
}

/** Only stiff studs couple the leaves as a spring; solver method, section 2.6. */
type StiffStuds = { stiffness: number; resonance: number };

function stiffStudsOf({ leaf1, leaf2, cavity, connection }: Frame): StiffStuds | undefined {
  if (connection.kind !== "wood_stud") return undefined;
  const stiffness = studStiffness(leaf1, leaf2, connection.spacing);
  return { stiffness, resonance: studResonance(leaf1, leaf2, { ...cavity, stiffness }) };
}

function doubleModel(description: DoubleDescription): Model {
  const frame = frameOf(description);
  const studs = stiffStudsOf(frame);
  const facts: TransmissionFacts = {
    ...factsOf([frame.leaf1, frame.leaf2], frame.cavity.depth, frame.cap),
    massAirMass: massAirMass(frame.leaf1, frame.leaf2, frame.cavity),
    ...(studs && { studResonance: studs.resonance }),
  };
  return { facts, partsAt: (frequency) => doubleParts(frame, studs, frequency) };
}

function doubleParts(frame: Frame, studs: StiffStuds | undefined, frequency: number): TransmissionParts {
  const { leaf1, leaf2, connection, size } = frame;
  const window = diffuseWindow(size, frequency);
  const layers = cavityLayers(frame.cavity, frequency);
  const spring = studs && studSpring(studs.stiffness, studs.resonance, frequency);
  const air = stackTransmission({ leaf1, leaf2, layers, ...(spring && { spring }) }, frequency, window);
  const cap = energyOf(-frame.cap);
  if (connection.kind === "none") return { air, bridge: 0, cap };
  const pair = [leaf1, leaf2].map((leaf) =>
    bridgedLeaf(leaf, leafTransmission(leaf, frequency, window), frequency, window),
  );
  const share = studs ? bridgeShare(studs.resonance, frequency) : 1;
  return { air, bridge: share * bridgeTransmission([pair[0], pair[1]], connection, frequency), cap };
}
