/**
 * Carbon dioxide in a room that air is mixed well in: C(t) = C_end + (C_0 - C_end) exp(-Q t/V), C_end = C_out + G/Q, and
 * without any air brought in C_0 + G t/V. For trying out; nothing of it is kept in the plan or weighed.
 */
export interface Breathing {
  drumming: number;
  sitting: number;
}

/** Parts per million outdoors, as in the problem the sitting rate was read in. */
export const OUTDOORS = 400;
/** m3/h of carbon dioxide of somebody sitting: 0.30 l/min, read in a textbook problem after ASHRAE 62-1999. */
const SITTING = (0.3 * 60) / 1000;
/**
 * Drumming takes 6.3 to 8.1 times the rate of rest, read in two studies of drummers; sitting takes 1.2 (from memory:
 * ASHRAE 62). The middle of the two over 1.2 is six times somebody sitting: our reckoning.
 */
const DRUMMING = ((6.3 + 8.1) / 2 / 1.2) * SITTING;
const MILLION = 1e6;

/** m3/h of carbon dioxide from everybody in the room. */
export const breathOf = ({ drumming, sitting }: Breathing): number => drumming * DRUMMING + sitting * SITTING;

/** Parts per million after so many minutes; `flow` m3/h of air from outdoors, `volume` m3. */
export function carbonDioxide(minutes: number, { breath, flow, volume }: { breath: number; flow: number; volume: number }): number {
  const hours = minutes / 60;
  if (flow <= 0) return OUTDOORS + (MILLION * breath * hours) / volume;
  const end = (MILLION * breath) / flow;
  return OUTDOORS + end * (1 - Math.exp((-flow * hours) / volume));
}

/** m3/h that hold an aim for good; null where the aim is no more than what comes in from outdoors. */
export const flowFor = (aim: number, breath: number): number | null => (aim > OUTDOORS ? (MILLION * breath) / (aim - OUTDOORS) : null);

/** m3/h: 5 l/s a person and 0.3 l/s a m2 of floor, rooms for music and dance (ANSI/ASHRAE 62.1-2016, Table 6.2.2.1). */
export const standardFlow = (people: number, floor: number): number => 3.6 * (5 * people + 0.3 * floor);
