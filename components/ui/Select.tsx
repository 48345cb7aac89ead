import clsx from "clsx";
import { useId, type ComponentProps, type ReactNode } from "react";
import { Icon } from "../marks/Icon";
import { borderOf, describe, FieldFrame, inputClasses } from "./FieldFrame";

export interface Choice {
  value: string;
  label: string;
}

type Props = Omit<ComponentProps<"select">, "children"> & {
  label: ReactNode;
  choices: readonly Choice[];
  hint?: ReactNode;
  error?: string;
};

/** The browser's own list, with our arrow. */
export function Select({ label, choices, hint, error, className, id, ...rest }: Props) {
  const ownId = useId();
  const fieldId = id ?? ownId;
  return (
    <FieldFrame id={fieldId} label={label} hint={hint} error={error} className={className}>
      <div className="relative">
        <select
          {...rest}
          id={fieldId}
          aria-invalid={error ? true : undefined}
          aria-describedby={describe(fieldId, hint, error)}
          className={clsx(inputClasses, borderOf(error), "appearance-none pr-10")}
        >
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
        <span className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-ink2">
          <Icon name="fold" size={18} />
        </span>
      </div>
    </FieldFrame>
  );
}
