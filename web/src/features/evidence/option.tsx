interface OptionProps {
  label: string;
  isChosen?: boolean;
  isDisabled?: boolean;
  onChoose: () => void;
}

/** A quiet word that can be chosen; bold while it is. */
export function Option({ label, isChosen, isDisabled, onChoose }: OptionProps) {
  return (
    <button
      type="button"
      aria-pressed={isChosen}
      disabled={isDisabled}
      className={isChosen ? "hit font-bold" : "link hit disabled:text-quiet disabled:no-underline"}
      onClick={onChoose}
    >
      {label}
    </button>
  );
}
