"use client";

import { useSyncExternalStore } from "react";

export interface BrowserPlace {
  timeZone: string;
  currency: string;
}

/** Before the browser has spoken, and where it says nothing. */
const nowhere: BrowserPlace = { timeZone: "UTC", currency: "EUR" };

/** ISO 4217 of the regions whose money is not the euro; from memory: ISO 4217, list one. A default only: it can be changed. */
const money: Record<string, string> = {
  AU: "AUD", BR: "BRL", CA: "CAD", CH: "CHF", CN: "CNY", CZ: "CZK", DK: "DKK", GB: "GBP", HU: "HUF", IL: "ILS", IN: "INR", JP: "JPY",
  KR: "KRW", MX: "MXN", NO: "NOK", NZ: "NZD", PL: "PLN", RO: "RON", SE: "SEK", TR: "TRY", US: "USD", ZA: "ZAR",
};

export const currencyOf = (language: string): string => {
  const region = /[-_]([A-Z]{2})\b/.exec(language)?.[1];
  return (region && money[region]) || nowhere.currency;
};

/** The clock and the money that this browser lives by. */
export function readBrowserPlace(): BrowserPlace {
  return { timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone || nowhere.timeZone, currency: currencyOf(navigator.language) };
}

let place: BrowserPlace | undefined;
const subscribe = () => () => undefined;

export const useBrowserPlace = (): BrowserPlace => useSyncExternalStore(subscribe, () => (place ??= readBrowserPlace()), () => nowhere);
