import clsx from "clsx";
import type { ComponentProps } from "react";

/** Page margins of the three widths; room at the foot for the phone's bar where there is one. */
export function Page({ className, bar, ...rest }: ComponentProps<"main"> & { bar?: boolean }) {
  return (
    <main
      {...rest}
      className={clsx("mx-auto max-w-[1440px] px-3 pb-8 pt-3 mid:px-6 mid:pb-10 mid:pt-8 wide:px-8 wide:pb-12", bar && "max-mid:pb-24", className)}
    />
  );
}
