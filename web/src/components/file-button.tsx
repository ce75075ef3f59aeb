import { useRef, type ReactNode } from "react";
import { Button } from "./button.tsx";

interface FileButtonProps {
  /** As the attribute of a file input has it. */
  accept: string;
  /** Bytes a file may have. */
  most: number;
  onText: (text: string, name: string) => void;
  /** Told in a sentence why a file was not taken. */
  onRefused: (sentence: string) => void;
  children: ReactNode;
}

/** Opens the browser's choice of a file and reads it as text. */
export function FileButton({ accept, most, onText, onRefused, children }: FileButtonProps) {
  const input = useRef<HTMLInputElement>(null);
  const read = async (file: File): Promise<void> => {
    if (file.size > most) return onRefused(`${file.name} is larger than ${most / 1e6} MB.`);
    const bytes = new Uint8Array(await file.arrayBuffer());
    if (bytes.includes(0)) return onRefused(`${file.name} is no text.`);
    onText(new TextDecoder().decode(bytes), file.name);
  };
  return (
    <>
      <input
        ref={input}
        type="file"
        accept={accept}
        hidden
        aria-label={typeof children === "string" ? children : undefined}
        onChange={({ target }) => {
          const file = target.files?.[0];
          // The same file, put right, can be chosen again.
          if (file) void read(file).finally(() => (target.value = ""));
        }}
      />
      <Button onClick={() => input.current?.click()}>{children}</Button>
    </>
  );
}
