import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { Criterion, Plan, Receiver } from "@/lib/noise/plan";
import { bandWords, formatBand, oneDecimal } from "../format";
import { Icon } from "../marks/Icon";
import { Cell, HeadCell, Row, RowHead, Table } from "../ui/Table";
import { VisuallyHidden } from "../ui/VisuallyHidden";
import { placeWords } from "./listenerPatches";
import { averagingWords, dayWords, documentWords, figureWords, hoursWords, indoorsWords, windowWords } from "./limitWords";

/** Why the fields are text for this reader. */
export function LockedLine({ reason }: { reason: string }) {
  return (
    <p className="flex items-center gap-2 text-second text-ink2">
      <Icon name="lock" size={18} />
      {reason}
    </p>
  );
}

function Lines({ lines }: { lines: readonly (readonly [string, string])[] }) {
  return (
    <dl className="grid gap-x-8 gap-y-3 mid:grid-cols-2">
      {lines
        .filter(([, words]) => words !== "")
        .map(([label, words]) => (
          <div key={label} className="min-w-0">
            <dt className="text-second text-ink2">{label}</dt>
            <dd className="font-semibold wrap-anywhere">{words}</dd>
          </div>
        ))}
    </dl>
  );
}

/** A limit as text: for who may read it and not change it. */
export function ReadLimit({ limit }: { limit: Criterion }) {
  return (
    <div className="grid gap-4">
      {limit.clauseText && <blockquote className="rounded-control border border-edge p-4 text-lead whitespace-pre-line">“{limit.clauseText}”</blockquote>}
      <Lines
        lines={[
          ["Limit", `${limit.name}: ${figureWords(limit)}`],
          ["Where it stands", documentWords(limit.provenance)],
          ["In force since", limit.inForce ? dayWords(limit.inForce) : ""],
          ["Read on", limit.readOn ? dayWords(limit.readOn) : ""],
          ["Edition", limit.edition],
          ["Where it is checked", [indoorsWords(limit.indoors), limit.place].filter(Boolean).join(", ")],
          ["Hours", hoursWords(limit.hours)],
          ["Averaged over", averagingWords[limit.averaging]],
          ["Their window", limit.window ? windowWords[limit.window].toLowerCase() : "not said"],
        ]}
      />
    </div>
  );
}

export function ReadListener({ listener, plan }: { listener: Receiver; plan: Plan }) {
  return (
    <div className="grid gap-4">
      <Lines
        lines={[
          ["Listener", listener.name],
          ["Where", placeWords(plan, listener)],
          ["In a sentence", listener.says],
        ]}
      />
    </div>
  );
}

/** The figures of the chart in a table, for who has no fields. */
export function ReadFigures({ limit }: { limit: Criterion }) {
  const rows = [
    ["Limit, dB", limit.levels],
    ["The night itself, dB", limit.background],
  ] as const;
  const drawn = rows.filter(([, levels]) => levels !== null);
  if (drawn.length === 0) return null;
  return (
    <div tabIndex={0} role="region" aria-label="Figures of the limit" className="overflow-x-auto">
      <Table>
        <thead>
          <tr>
            <HeadCell>Band, Hz</HeadCell>
            {OCTAVE_BANDS.map((band) => (
              <HeadCell key={band} figures>
                <span aria-hidden="true">{formatBand(band)}</span>
                <VisuallyHidden>{bandWords(band)}</VisuallyHidden>
              </HeadCell>
            ))}
          </tr>
        </thead>
        <tbody>
          {drawn.map(([words, levels]) => (
            <Row key={words}>
              <RowHead>{words}</RowHead>
              {OCTAVE_BANDS.map((band, index) => (
                <Cell key={band} figures>
                  {levels?.[index] == null ? <VisuallyHidden>no figure</VisuallyHidden> : oneDecimal(levels[index]).replace(/\.0$/, "")}
                </Cell>
              ))}
            </Row>
          ))}
        </tbody>
      </Table>
    </div>
  );
}
