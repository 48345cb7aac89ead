import clsx from "clsx";
import { useId, type ComponentProps, type ReactNode } from "react";
import { borderOf, describe, FieldFrame, inputClasses } from "./FieldFrame";

type Props = ComponentProps<"input"> & {
  label: ReactNode;
  hint?: ReactNode;
  error?: string;
  /** Stands to the right of the input, as "Show" beside a password. */
  beside?: ReactNode;
};

export function TextField({ label, hint, error, beside, className, id, ...rest }: Props) {
  const ownId = useId();
  const fieldId = id ?? ownId;
  return (
    <FieldFrame id={fieldId} label={label} hint={hint} error={error} className={className}>
      <div className="flex gap-2">
        <input
          {...rest}
          id={fieldId}
          aria-invalid={error ? true : undefined}
          aria-describedby={describe(fieldId, hint, error)}
          className={clsx(inputClasses, borderOf(error))}
        />
        {beside}
      </div>
    </FieldFrame>
  );
}
