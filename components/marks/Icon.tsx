/** Drawn on a 20 px grid with a 1.7 stroke and round joins. */
const drawings = {
  weigh: "M2 7.6 18 5.4M6.5 7V3.4M3.6 7.4v3M1.6 10.4h4v4.6h-4zM14 6v3M12.4 9h3.2l1.6 6.4h-6.4z",
  print: "M5.5 7V3h9v4M5.5 14H3V7.5h14V14h-2.5M5.5 11.5h9V17h-9z",
  moon: "M16 12.2A6.8 6.8 0 0 1 7.8 4a6.8 6.8 0 1 0 8.2 8.2z",
  plus: "M10 4v12M4 10h12",
  lock: "M5 9h10v8H5zM7 9V6.2a3 3 0 0 1 6 0V9M10 12.2v1.8",
  camera: "M3 6.5h3.4L8 4.2h4l1.6 2.3H17V16H3zM10 8.2a3 3 0 1 0 0 6 3 3 0 0 0 0-6z",
  tick: "m4 10.8 4 4L16 6",
  hand: "M6.2 11V5.4a1.1 1.1 0 0 1 2.2 0V9M8.4 9V3.9a1.1 1.1 0 0 1 2.2 0V9M10.6 9V4.6a1.1 1.1 0 0 1 2.2 0V10M12.8 10V6.6a1.1 1.1 0 0 1 2.2 0v5.6c0 2.9-1.9 4.8-4.7 4.8-2.3 0-3.4-1-4.4-2.8l-2-3.7c-.5-1 .8-1.8 1.5-.9z",
  note: "M4 3.5h12v8.8L11.6 17H4zM11.6 17v-4.7H16M7 7h6M7 10h4",
  brokenBeam: "M2.5 9.5h5l1.5-5M11 11.5l1.5-2.5h5M4 9.5V13M2.5 16.5 3.2 13h1.6l.7 3.5M14 9v4M12.5 16.5l.7-3.5h1.6l.7 3.5",
  noSignal: "M3 17v-2.5M7.5 17v-5M12 17V9.5M16.5 17V6M3 4l13.5 13",
  arrow: "M3.5 10h13M11.5 5l5 5-5 5",
  back: "M16.5 10h-13M8.5 5l-5 5 5 5",
  up: "M10 16V4M5 9l5-5 5 5",
  down: "M10 4v12M5 11l5 5 5-5",
  fold: "m5 7.5 5 5 5-5",
  clock: "M10 3a7 7 0 1 0 0 14 7 7 0 0 0 0-14zM10 6v4.2l2.8 1.6",
  undo: "M7.5 4 4 7.5 7.5 11M4 7.5h7.2a4.3 4.3 0 0 1 0 8.6H8",
  mail: "M3 5h14v10.5H3zM3.5 5.5 10 11l6.5-5.5",
  remove: "M5 5l10 10M15 5 5 15",
  ear: "M5.5 8a4.5 4.5 0 1 1 9 0c0 3-2.6 3.7-3.1 6-.4 1.9-1.4 3-2.9 3-1.2 0-2-.6-2.3-1.7M8 8.2a2 2 0 1 1 4 0c0 1.5-1.6 1.7-1.7 3.1",
  find: "M8.6 3.2a5.4 5.4 0 1 0 0 10.8 5.4 5.4 0 0 0 0-10.8zM12.6 12.6 17 17",
  more: "M4.4 9.4a.6.6 0 1 0 0 1.2.6.6 0 0 0 0-1.2zM10 9.4a.6.6 0 1 0 0 1.2.6.6 0 0 0 0-1.2zM15.6 9.4a.6.6 0 1 0 0 1.2.6.6 0 0 0 0-1.2z",
} as const;

export type IconName = keyof typeof drawings;

/** Always beside a word; a button with nothing but an icon carries a label of its own. */
export function Icon({ name, size = 20 }: { name: IconName; size?: number }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 20 20"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.7"
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
      className="block flex-none"
    >
      <path d={drawings[name]} />
    </svg>
  );
}
