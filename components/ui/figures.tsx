"use client";

import { createContext, useContext, type ReactNode } from "react";

/** How somebody wants figures shown and typed. */
export interface Figures {
  units: "metric" | "us";
  mark: "point" | "comma";
}

const FiguresContext = createContext<Figures>({ units: "metric", mark: "point" });

export function FiguresProvider({ value, children }: { value: Figures; children: ReactNode }) {
  return <FiguresContext value={value}>{children}</FiguresContext>;
}

export const useFigures = (): Figures => useContext(FiguresContext);

/** A written figure with the reader's mark between whole and fraction. */
export const withMark = (text: string, mark: Figures["mark"]): string => (mark === "comma" ? text.replace(".", ",") : text);
