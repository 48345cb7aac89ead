import clsx from "clsx";

/** What brings somebody here; it decides nothing about rights. */
export const HATS = ["play", "advise", "build"] as const;
export type Hat = (typeof HATS)[number];

const words: Record<Hat, { label: string; says: string }> = {
  play: { label: "I play", says: "my own yard" },
  advise: { label: "I advise", says: "for clients" },
  build: { label: "I build", says: "on site" },
};

export const readHat = (text: string | undefined): Hat => HATS.find((hat) => hat === text) ?? "play";

export function HatChoice({ chosen, onChoose }: { chosen: Hat; onChoose: (hat: Hat) => void }) {
  return (
    <fieldset className="m-0 min-w-0 border-0 p-0">
      <legend className="mb-1.5 p-0 text-second font-semibold text-ink2">What brings you?</legend>
      <div className="grid grid-cols-3 gap-2">
        {HATS.map((hat) => {
          const lit = hat === chosen;
          return (
            <label
              key={hat}
              className={clsx(
                "relative min-h-11 cursor-pointer rounded-control px-2 py-2.5 text-center font-semibold has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-lamp",
                lit ? "border-2 border-ink bg-lampwash" : "border-[1.5px] border-edge hover:border-ink",
              )}
            >
              <input type="radio" name="hat" value={hat} checked={lit} onChange={() => onChoose(hat)} className="absolute inset-0 m-0 size-full cursor-pointer opacity-0" />
              {lit && <span aria-hidden="true" className="poise absolute left-1/2 top-[-2px] -ml-2.5 h-[9px] w-5 bg-lamp" />}
              <span className="block">{words[hat].label}</span>
              <span className={clsx("block text-least font-normal", lit ? "text-ink2" : "text-ink3")}>{words[hat].says}</span>
            </label>
          );
        })}
      </div>
    </fieldset>
  );
}
