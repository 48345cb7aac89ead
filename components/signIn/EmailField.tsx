import type { ComponentProps } from "react";
import { TextField } from "../ui/TextField";

type Props = Omit<ComponentProps<typeof TextField>, "label" | "name" | "type" | "onChange"> & { value: string; onType: (value: string) => void };

export function EmailField({ onType, ...rest }: Props) {
  return (
    <TextField
      autoComplete="username"
      {...rest}
      label="E-mail"
      name="email"
      type="email"
      inputMode="email"
      autoCapitalize="none"
      spellCheck={false}
      maxLength={254}
      onChange={(event) => onType(event.target.value)}
    />
  );
}
