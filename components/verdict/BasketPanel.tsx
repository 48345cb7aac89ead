"use client";

import { useRouter } from "next/navigation";
import type { PathVerdict } from "@/lib/noise/verdict";
import { elementAddress } from "../addresses";
import { bandWords } from "../format";
import type { WidthClass } from "../ui/widthClass";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { Basket, SpentWords } from "./Basket";
import type { Column } from "./columns";
import { openableId } from "./lever";
import { LeverBox } from "./LeverBox";
import { PathList } from "./PathList";
import type { Reading } from "./reading";
import type { Lit } from "./useLit";

const promised: Record<WidthClass, number> = { 390: 334, 720: 290, 1024: 420, 1440: 286 };

interface Props {
  projectId: string;
  lit: Lit;
  reading: Reading;
  column: Column;
}

/** The lit band in the balance, its paths, and what silencing the lit one would bring. */
export function BasketPanel({ projectId, lit, reading, column }: Props) {
  const router = useRouter();
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 460);
  const { paths } = reading.weighed;
  const addressOf = (path: PathVerdict) => {
    const id = openableId(reading.plan, path);
    return id === null ? null : elementAddress(projectId, id);
  };
  const open = (path: PathVerdict) => {
    const address = addressOf(path);
    if (address) router.push(address);
  };
  const title = column.band === null ? `The whole, in ${column.unit}` : `${bandWords(column.band)}, weighed`;
  return (
    <section aria-labelledby="weighed" className="min-w-0 pt-4 mid:pt-6.5">
      <div className="mb-4 flex flex-wrap items-baseline justify-between gap-x-3 px-4 mid:px-6.5">
        <h2 id="weighed" className="text-section">{title}</h2>
        <SpentWords column={column} />
      </div>
      <div className="px-4 mid:px-6.5">
        <div ref={place} className="overflow-hidden">
          {column.limit === null ? (
            <p className="pb-4 text-table text-ink2">There is no limit {column.where}, so there is no allowance to fill.</p>
          ) : (
            <Basket column={column} paths={paths} litId={lit.path?.id ?? null} width={width} />
          )}
        </div>
      </div>
      <div className="mt-4">
        <PathList paths={paths} column={column} litId={lit.path?.id ?? null} trial={lit.trial} onLight={lit.lightPath} onTrial={lit.toggleTrial} onOpen={open} />
      </div>
      {lit.path && (
        <LeverBox path={lit.path} column={column} weighed={reading.weighed} trial={lit.trial} onTrial={lit.toggleTrial} href={addressOf(lit.path)} />
      )}
    </section>
  );
}
