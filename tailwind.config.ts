import type { Config } from "tailwindcss";

const token = (name: string) => `var(--${name})`;

const colours = [
  "ground", "sheet", "well", "ink", "ink2", "ink3", "rule", "edge",
  "lamp", "lampwash", "onlamp", "under", "tight", "over",
  "slab", "slabink", "slabink2", "slabrule", "slablamp", "slabover", "slabedge",
];

const config: Config = {
  content: ["./app/**/*.{ts,tsx}", "./components/**/*.{ts,tsx}"],
  theme: {
    colors: {
      transparent: "transparent",
      current: "currentColor",
      inherit: "inherit",
      ...Object.fromEntries(colours.map((name) => [name, token(name)])),
    },
    screens: { mid: "640px", desk: "960px", wide: "1280px" },
    fontFamily: {
      body: ['"Atkinson Hyperlegible Next Variable"', "system-ui", "sans-serif"],
      figure: ['"Besley Variable"', "Georgia", "serif"],
    },
    fontSize: {
      verdict: ["40px", "1.12"],
      verdictDesk: ["34px", "1.14"],
      verdictPhone: ["27px", "1.17"],
      head: ["30px", "1.15"],
      section: ["22px", "1.2"],
      part: ["17px", "1.25"],
      lead: ["17px", "1.45"],
      base: ["16px", "1.45"],
      table: ["15px", "1.4"],
      second: ["14px", "1.4"],
      least: ["13px", "1.35"],
      chart: ["12px", "1.3"],
    },
    borderRadius: { none: "0", tag: "2px", control: "3px", sheet: "4px", full: "9999px" },
    extend: {
      transitionTimingFunction: { settle: "cubic-bezier(.2,.9,.25,1)" },
      transitionDuration: { hover: "120ms", settle: "320ms" },
    },
  },
};

export default config;
