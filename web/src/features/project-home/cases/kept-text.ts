import { useEffect, useState } from "react";

/** A text that outlives the page in this browser, until it is empty. */
export function useKeptText(key: string): [string, (text: string) => void] {
  const [text, setText] = useState(() => read(key));
  useEffect(() => {
    try {
      if (text === "") localStorage.removeItem(key);
      else localStorage.setItem(key, text);
    } catch {
      // Storage is refused or full: the text lasts as long as the page.
    }
  }, [key, text]);
  return [text, setText];
}

function read(key: string): string {
  try {
    return localStorage.getItem(key) ?? "";
  } catch {
    return "";
  }
}
