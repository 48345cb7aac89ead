"use client";

import { useState, type ComponentProps } from "react";
import { Button } from "../ui/Button";
import { TextField } from "../ui/TextField";

type Props = Omit<ComponentProps<typeof TextField>, "type" | "beside" | "onChange"> & {
  /** In the button's label: "the password". */
  what?: string;
  value: string;
  onType: (value: string) => void;
  autoComplete: "current-password" | "new-password";
};

/** A password that can be shown, pasted and filled in by a manager. */
export function PasswordField({ what = "the password", onType, ...rest }: Props) {
  const [shown, setShown] = useState(false);
  return (
    <TextField
      spellCheck={false}
      autoCapitalize="none"
      {...rest}
      type={shown ? "text" : "password"}
      onChange={(event) => onType(event.target.value)}
      beside={
        <Button className="flex-none" aria-label={`${shown ? "Hide" : "Show"} ${what}`} onClick={() => setShown(!shown)}>
          {shown ? "Hide" : "Show"}
        </Button>
      }
    />
  );
}
