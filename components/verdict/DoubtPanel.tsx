import type { ReceiverVerdict } from "@/lib/noise/verdict";
import { bandWords, capitalise, formatNumber, withUnit } from "../format";
import { bandRangeWords } from "./notesWords";

interface Props {
  id: string;
  listener: string;
  weighed: ReceiverVerdict;
}

const partWords = {
  source: "what plays",
  leaving: "on the way out",
  entering: "on the way in",
} as const;

const sizeWords = (decibels: number) => withUnit(formatNumber(decibels, 1), "dB");

/** Doubts add as squares, so the bar of each is its part of the sum of squares. */
function SquaresBar({ part }: { part: number }) {
  const length = Math.max(2, Math.round(part * 120));
  return (
    <svg width="120" height="10" viewBox="0 0 120 10" aria-hidden="true" className="block">
      <path d="M0 9.5H120" className="stroke-rule" />
      <rect y="1" width={length} height="8" className="fill-ink" />
    </svg>
  );
}

/** Parts under this would read 0.0; they stand together in one row. */
const SMALL = 0.05;

function Doubts({ doubts }: Pick<ReceiverVerdict, "doubts">) {
  const small = doubts.filter(({ decibels }) => decibels < SMALL);
  const together = Math.sqrt(small.reduce((sum, { decibels }) => sum + decibels ** 2, 0));
  const whole = doubts.reduce((sum, { decibels }) => sum + decibels ** 2, 0) || 1;
  return (
    <table className="w-full border-collapse text-table">
      <thead>
        <tr className="text-left text-second text-ink2">
          <th scope="col" className="border-b-2 border-ink pb-1.5 font-semibold">Where the doubt comes from</th>
          <th scope="col" className="border-b-2 border-ink pb-1.5 font-semibold max-mid:hidden">Its figures are</th>
          <th scope="col" className="border-b-2 border-ink pb-1.5 text-right font-semibold">Give or take</th>
          <th scope="col" className="border-b-2 border-ink pb-1.5 pl-5 font-semibold max-mid:hidden">Part of the whole</th>
        </tr>
      </thead>
      <tbody>
        {doubts.filter((doubt) => !small.includes(doubt)).map((doubt) => (
          <tr key={`${doubt.what} ${doubt.partId} ${doubt.name}`} className="border-b border-rule">
            <th scope="row" className="py-2 pr-3 text-left font-semibold">
              {capitalise(doubt.name)} {doubt.what !== "outdoors" && <span className="font-normal text-ink3">{partWords[doubt.what]}</span>}
              <span className="block text-second font-normal text-ink2 mid:hidden">{doubt.basis}</span>
            </th>
            <td className="py-2 pr-3 text-ink2 max-mid:hidden">{doubt.basis}</td>
            <td className="whitespace-nowrap py-2 text-right">{sizeWords(doubt.decibels)}</td>
            <td className="py-2 pl-5 max-mid:hidden">
              <SquaresBar part={doubt.decibels ** 2 / whole} />
            </td>
          </tr>
        ))}
        {small.length > 0 && (
          <tr className="border-b border-rule text-ink2">
            <th scope="row" className="py-2 pr-3 text-left font-normal">{`The other ${small.length} together`}</th>
            <td className="py-2 pr-3 max-mid:hidden" />
            <td className="whitespace-nowrap py-2 text-right">{together < SMALL ? `under ${sizeWords(0.1)}` : sizeWords(together)}</td>
            <td className="py-2 pl-5 max-mid:hidden">
              <SquaresBar part={together ** 2 / whole} />
            </td>
          </tr>
        )}
      </tbody>
    </table>
  );
}

/** "How sure is this?": what the doubt is made of, largest first, and what of the verdict rests on estimates. */
export function DoubtPanel({ id, listener, weighed }: Props) {
  const { doubt, band, doubts, restsOn, weighted } = weighed;
  const at = band === null ? "" : ` at ${bandWords(band)}`;
  const where = weighted ? " as a whole" : at;
  return (
    <section id={id} aria-labelledby={`${id}-head`} className="mt-3 rounded-sheet bg-sheet p-4 mid:mt-5 mid:p-6.5">
      <h2 id={`${id}-head`} tabIndex={-1} className="text-section">
        How sure is this?
      </h2>
      <p className="mt-1 max-w-[68ch] text-ink2">
        {doubt === null
          ? `Nothing is weighed for ${listener} yet, so there is no doubt to name.`
          : `The level for ${listener}${where} is good to ${sizeWords(doubt)} either way: about two chances in three that the true one lies within. The parts below${weighted ? `, as they stand${at},` : ""} add as squares, so the largest counts most.`}
      </p>
      {doubts.length > 0 && (
        <div className="mt-4">
          <Doubts doubts={doubts} />
        </div>
      )}
      {restsOn.length > 0 && (
        <>
          <h3 className="mt-5 text-part">Rests on estimates</h3>
          <ul className="mt-1 text-table text-ink2">
            {restsOn.map(({ partId, name, bands }) => (
              <li key={partId}>{`${name}, ${bandRangeWords(bands)}`}</li>
            ))}
          </ul>
          <p className="mt-1 text-second text-ink3">As long as it does, the result cannot be signed.</p>
        </>
      )}
    </section>
  );
}
