import { useState, type ComponentProps } from "react";
import { TextField } from "./text-field.tsx";

/** A password, with a button that shows what is typed. */
export function PasswordField(props: Omit<ComponentProps<typeof TextField>, "type" | "inset">) {
  const [isShown, setShown] = useState(false);
  const act = isShown ? "hide" : "show";
  return (
    <TextField
      {...props}
      type={isShown ? "text" : "password"}
      autoCapitalize="off"
      spellCheck={false}
      inset={
        <button type="button" className="link" aria-label={`${act} the password`} onClick={() => setShown(!isShown)}>
          {act}
        </button>
      }
    />
  );
}
