import { Button } from "./button.tsx";
import { Icon } from "./icon.tsx";
import { chooseTheme, useTheme } from "./theme.ts";

/** From light to dark and back; the choice is remembered. */
export function ThemeButton() {
  const other = useTheme() === "dark" ? "light" : "dark";
  const label = `Show the page ${other}`;
  return (
    <Button
      kind="quiet"
      aria-label={label}
      title={label}
      className="max-desk:px-2.5!"
      onClick={() => chooseTheme(other)}
    >
      <Icon name="theme" weight={1.7} />
      <span className="desk:hidden">{other}</span>
    </Button>
  );
}
