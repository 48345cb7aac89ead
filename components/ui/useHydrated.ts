"use client";

import { useSyncExternalStore } from "react";

const never = () => () => undefined;

/** Whether scripts run here yet: what the server drew must work as plain links until then. */
export const useHydrated = (): boolean => useSyncExternalStore(never, () => true, () => false);
