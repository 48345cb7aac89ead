import clsx from "clsx";
import Link from "next/link";
import { useId, type ComponentProps, type ReactNode } from "react";

export type ButtonLook = "ink" | "lamp" | "plain" | "square";

const base =
  "inline-flex min-h-10 items-center justify-center gap-2 rounded-control border-[1.5px] text-table font-semibold leading-none no-underline";

const looks: Record<ButtonLook, string> = {
  ink: "border-ink bg-ink px-4 text-sheet hover:bg-ink2 hover:border-ink2",
  lamp: "border-lamp bg-lamp px-4 text-onlamp hover:border-ink",
  plain: "border-edge bg-transparent px-4 text-ink hover:border-ink hover:bg-well",
  square: "w-10 flex-none border-edge bg-transparent text-ink hover:border-ink hover:bg-well",
};

const withheld = "border-edge bg-well px-4 text-ink2 cursor-not-allowed";

interface Look {
  look?: ButtonLook;
  icon?: ReactNode;
}

type ButtonProps = ComponentProps<"button"> &
  Look & {
    /** Why it cannot be pressed now: the button stays focusable and says so. */
    reason?: string;
  };

export function Button({ look = "plain", icon, reason, children, className, onClick, type = "button", ...rest }: ButtonProps) {
  const reasonId = useId();
  const blocked = reason !== undefined;
  return (
    <>
      <button
        {...rest}
        type={blocked ? "button" : type}
        aria-disabled={blocked || undefined}
        aria-describedby={blocked ? reasonId : rest["aria-describedby"]}
        onClick={blocked ? undefined : onClick}
        className={clsx(base, blocked ? withheld : looks[look], className)}
      >
        {icon}
        {children}
      </button>
      {blocked && (
        <span id={reasonId} className="mt-1 block text-least text-ink2">
          {reason}
        </span>
      )}
    </>
  );
}

type LinkProps = ComponentProps<typeof Link> & Look;

export function LinkButton({ look = "plain", icon, children, className, ...rest }: LinkProps) {
  return (
    <Link {...rest} className={clsx(base, looks[look], className)}>
      {icon}
      {children}
    </Link>
  );
}
