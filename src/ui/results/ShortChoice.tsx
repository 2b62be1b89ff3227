import { useId } from 'react';

interface ShortChoiceProps<Id extends string> {
  readonly label: string;
  readonly choices: readonly { readonly id: Id; readonly label: string }[];
  readonly selected: Id;
  readonly onSelect: (id: Id) => void;
}

/** A short choice in the corner of a panel: exact · decimals · symbols. Radio buttons without their circles. */
export function ShortChoice<Id extends string>(props: ShortChoiceProps<Id>) {
  const { label, choices, selected, onSelect } = props;
  const name = useId();
  return (
    <fieldset className="short-choice">
      <legend className="visually-hidden">{label}</legend>
      {choices.map(choice => (
        <label key={choice.id} className="short-choice-choice">
          <input
            type="radio"
            className="visually-hidden"
            name={name}
            checked={choice.id === selected}
            onChange={() => onSelect(choice.id)}
          />
          <span className="short-choice-text">{choice.label}</span>
        </label>
      ))}
    </fieldset>
  );
}
