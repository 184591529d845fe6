export interface ComboboxOption {
  value: string;
  label: string;
  /** A few quiet words that help to tell it from its neighbours; they are searched too. */
  detail?: string;
}

const plain = (text: string) =>
  text
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();

/** The options that hold every word typed, those whose label begins with it first; all of them when nothing is typed. */
export function matchingOptions(options: readonly ComboboxOption[], search: string): ComboboxOption[] {
  const wanted = plain(search);
  if (wanted === '') return [...options];
  const words = wanted.split(' ');
  const matches = options.filter((option) => {
    const text = plain(`${option.label} ${option.detail ?? ''}`);
    return words.every((word) => text.includes(word));
  });
  const begins = (option: ComboboxOption) => plain(option.label).startsWith(wanted);
  return [...matches.filter(begins), ...matches.filter((option) => !begins(option))];
}
