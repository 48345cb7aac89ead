/** A browser that is signed in. Moments are ISO texts. */
export interface Device {
  key: string;
  device: string;
  beganAt: string;
  seenAt: string;
  current: boolean;
}

export interface AccountFacts {
  name: string;
  email: string;
  theme: "light" | "dark" | "system";
  units: "metric" | "us";
  decimalMark: "point" | "comma";
}
