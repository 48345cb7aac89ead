import clsx from "clsx";
import { useId, type ReactNode } from "react";
import { FieldError } from "./FieldFrame";

interface Option<T extends string> {
  value: T;
  label: ReactNode;
  says?: ReactNode;
}

interface Props<T extends string> {
  legend: ReactNode;
  name: string;
  options: readonly Option<T>[];
  chosen: T;
  onChoose: (value: T) => void;
  error?: string;
}

/** The browser's own radio buttons, one line each; the whole line answers to a press. */
export function RadioGroup<T extends string>({ legend, name, options, chosen, onChoose, error }: Props<T>) {
  const id = useId();
  return (
    <fieldset className="m-0 min-w-0 border-0 p-0" aria-describedby={`${id}-error`}>
      <legend className="mb-1 p-0 text-second font-semibold text-ink2">{legend}</legend>
      <div className="flex flex-wrap gap-x-6">
        {options.map(({ value, label, says }) => (
          <label key={value} className={clsx("flex min-h-10 cursor-pointer items-center gap-2.5", says !== undefined && "basis-full")}>
            <input type="radio" name={name} value={value} checked={value === chosen} onChange={() => onChoose(value)} className="size-5 flex-none accent-ink" />
            <span>
              <span className="block font-medium">{label}</span>
              {says && <span className="block text-second text-ink2">{says}</span>}
            </span>
          </label>
        ))}
      </div>
      <FieldError id={id} error={error} />
    </fieldset>
  );
}
