/** The yard drawn beside the sign-in form, in metres: along the cut, and over ground. It is an example to look at. */
export const exampleYard = {
  from: -1,
  to: 25,
  studio: { from: 0.6, to: 5, wall: 2.1, ridge: 3.1 },
  fence: { along: 10.2, height: 1.7 },
  tree: { along: 12.9, trunk: 1.3, crown: 1 },
  house: { from: 15.8, to: 23.2, wall: 4.6, ridge: 6.6, floor: 2.4 },
} as const;

export interface ExampleStation {
  words: string;
  along: number;
  height: number;
  /** Left out where there is little room. */
  minor?: boolean;
  tone: "source" | "plain" | "listener";
}

export const exampleStations: readonly ExampleStation[] = [
  { words: "at the kit", along: 2.7, height: 1.2, tone: "source" },
  { words: "by the door", along: 5.8, height: 1.2, minor: true, tone: "plain" },
  { words: "at the fence", along: 10.2, height: 1.9, tone: "plain" },
  { words: "at the wall", along: 15.2, height: 3.5, minor: true, tone: "plain" },
  { words: "in bed", along: 18.1, height: 3.1, tone: "listener" },
];
