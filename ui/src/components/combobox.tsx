import { useEffect, useId, useRef, useState, type KeyboardEvent } from 'react';
import styles from './combobox.module.css';
import { type ComboboxOption, matchingOptions } from './combobox-options';
import { Field, type FieldProps } from './field';
import fieldStyles from './field.module.css';

interface ComboboxProps extends FieldProps {
  options: readonly ComboboxOption[];
  /** The chosen option's value; '' when nothing is chosen. */
  value: string;
  onChoose: (value: string) => void;
  /** Left without a choice: by Escape, or by going elsewhere. */
  onLeave?: () => void;
  placeholder?: string;
  /** Opened by an act of the person, who goes on typing here. */
  takesFocus?: boolean;
  /** May the choice be taken back by emptying the box? */
  isClearable?: boolean;
}

/** Chooses one of many by typing a part of its name; arrows, Enter and Escape do what they do everywhere. */
export function Combobox({
  options,
  value,
  onChoose,
  onLeave,
  placeholder,
  takesFocus,
  isClearable,
  ...field
}: ComboboxProps) {
  const listId = useId();
  const input = useRef<HTMLInputElement>(null);
  const chosenLabel = options.find((option) => option.value === value)?.label ?? '';
  /** What is typed while searching; null: the box shows what is chosen. */
  const [search, setSearch] = useState<string | null>(null);
  const [activeIndex, setActiveIndex] = useState(0);
  const isOpen = search !== null;
  const matches = isOpen ? matchingOptions(options, search === chosenLabel ? '' : search) : [];
  const active = matches[Math.min(activeIndex, matches.length - 1)];
  const optionId = (option: ComboboxOption) => `${listId}-${options.indexOf(option)}`;

  useEffect(() => {
    if (takesFocus) input.current?.focus();
  }, [takesFocus]);
  useEffect(() => {
    if (active) document.getElementById(`${listId}-${options.indexOf(active)}`)?.scrollIntoView({ block: 'nearest' });
  }, [active, listId, options]);

  const open = (text: string) => {
    setSearch(text);
    setActiveIndex(0);
  };
  const choose = (option: ComboboxOption) => {
    setSearch(null);
    onChoose(option.value);
  };
  const leave = () => {
    const typed = (search ?? '').trim().toLowerCase();
    const exact =
      matches.find((option) => option.label.toLowerCase() === typed) ?? (matches.length === 1 ? matches[0] : null);
    setSearch(null);
    if (isClearable && search === '' && value !== '') onChoose('');
    else if (exact && typed !== '' && exact.value !== value) onChoose(exact.value);
    else onLeave?.();
  };
  const handleKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      if (!isOpen) return open(chosenLabel);
      const step = event.key === 'ArrowDown' ? 1 : -1;
      setActiveIndex((Math.min(activeIndex, matches.length - 1) + step + matches.length) % Math.max(1, matches.length));
    } else if (event.key === 'Enter' && isOpen) {
      event.preventDefault();
      if (active) choose(active);
    } else if (event.key === 'Escape' && isOpen) {
      event.preventDefault();
      event.stopPropagation();
      setSearch(null);
      onLeave?.();
    }
  };

  return (
    <Field {...field}>
      {(control) => (
        <span className={styles.wrap}>
          <input
            {...control}
            ref={input}
            className={fieldStyles.control}
            type="text"
            role="combobox"
            autoComplete="off"
            spellCheck={false}
            aria-autocomplete="list"
            aria-expanded={isOpen}
            aria-controls={isOpen ? listId : undefined}
            aria-activedescendant={isOpen && active ? optionId(active) : undefined}
            placeholder={placeholder}
            value={search ?? chosenLabel}
            onFocus={(event) => {
              event.target.select();
              if (value === '') open('');
            }}
            onClick={() => !isOpen && open(chosenLabel)}
            onChange={(event) => open(event.target.value)}
            onBlur={leave}
            onKeyDown={handleKeyDown}
          />
          {isOpen && (
            <ul
              id={listId}
              role="listbox"
              className={styles.list}
              aria-label={typeof field.label === 'string' ? field.label : 'Choices'}
            >
              {matches.map((option) => (
                // The keys are the box's: it keeps focus, as the pattern wants it.
                // eslint-disable-next-line jsx-a11y/click-events-have-key-events
                <li
                  key={option.value}
                  id={optionId(option)}
                  role="option"
                  aria-selected={option === active}
                  className={styles.option}
                  // The box keeps focus: losing it first would close the list under the pointer.
                  onPointerDown={(event) => event.preventDefault()}
                  onClick={() => choose(option)}
                >
                  {option.label}
                  {option.detail && <span className={styles.detail}>{option.detail}</span>}
                </li>
              ))}
              {matches.length === 0 && (
                <li role="option" aria-selected={false} aria-disabled="true" className={styles.none}>
                  Nothing in the list is named like that
                </li>
              )}
            </ul>
          )}
        </span>
      )}
    </Field>
  );
}
