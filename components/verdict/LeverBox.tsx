import type { PathVerdict, ReceiverVerdict } from "@/lib/noise/verdict";
import { capitalise, formatNumber, marginWords, wholeDecibels, withUnit } from "../format";
import { Button, LinkButton } from "../ui/Button";
import { inSentence } from "./chartWords";
import { byShare, isNumber, withoutOf, type Column } from "./columns";

interface Props {
  path: PathVerdict;
  column: Column;
  weighed: ReceiverVerdict;
  trial: boolean;
  onTrial: () => void;
  /** Address of the path's own page; null where it has none. */
  href: string | null;
}

/** "2 dB", "less than 1 dB" */
function dropWords(drop: number): string {
  const whole = Math.round(drop);
  return whole === 0 ? "less than 1\u00a0dB" : withUnit(formatNumber(whole), "dB");
}

/** The two loudest paths together, where that is what the verdict has weighed. */
function togetherWords({ path, column, weighed }: Props, other: PathVerdict): string {
  const pair = weighed.facts.leading.slice(0, 2).map(({ pathId }) => pathId);
  const leads = column.band === weighed.band || column.index === null;
  if (!leads || !pair.includes(path.id) || !pair.includes(other.id)) return "";
  return `; the two together are worth ${dropWords(weighed.facts.dropFirstTwo)}`;
}

export function silencedWords(props: Props): string {
  const { path, column, weighed } = props;
  const silent = withoutOf(path, column);
  if (!isNumber(silent) || !isNumber(column.level)) return "";
  const lower = `That is ${dropWords(column.level - silent)} lower`;
  if (column.limit === null) return `${lower}.`;
  const margin = column.limit - silent;
  if (column.state !== "over") return `${lower}: ${marginWords("under", margin)} the limit.`;
  if (margin >= 0) return `${lower} and ${marginWords("under", margin)}.`;
  const other = byShare(weighed.paths, column).find(({ id }) => id !== path.id);
  const rest = other ? ` ${capitalise(inSentence(other.name))} has to give as well${togetherWords(props, other)}.` : "";
  return `${lower} and still ${marginWords("over", margin)}.${rest}`;
}

/** What silencing the lit path would bring, and the way to its page. */
export function LeverBox(props: Props) {
  const { path, column, trial, onTrial, href } = props;
  const silent = withoutOf(path, column);
  const level = isNumber(silent) ? withUnit(wholeDecibels(silent), column.unit) : wholeDecibels(silent);
  return (
    <section className="mx-4 mb-5 mt-5 rounded-sheet border-[1.5px] border-ink px-4 py-3.5 mid:mx-6.5 mid:mb-6">
      <h3 className="text-part">{`${path.name} silenced: ${level}`}</h3>
      <p className="mt-1 text-second text-ink2">{silencedWords(props)}</p>
      <div className="screen-only mt-3 flex flex-wrap gap-2">
        {href && <LinkButton href={href}>{`Open ${inSentence(path.name)}`}</LinkButton>}
        <Button aria-pressed={trial} onClick={onTrial} className="aria-pressed:border-ink aria-pressed:bg-lampwash">
          {trial ? "End the trial" : "Silence it on trial"}
        </Button>
      </div>
    </section>
  );
}
