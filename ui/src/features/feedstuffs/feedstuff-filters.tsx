import { useSearchParams } from 'react-router-dom';
import { SelectField } from '../../components/select-field';
import { TextField } from '../../components/text-field';
import { categoryTitle } from '../../lib/feedstuff-category';
import type { FeedstuffFilter } from './feedstuff-filter';
import styles from './feedstuff-filters.module.css';

const origins = [
  { value: 'book', label: 'Book values' },
  { value: 'firm', label: 'Own, as analysed' },
];

/** Search, origin and category stand in the address: Back and a shared link show the same rows. */
export function useFeedstuffFilter(): FeedstuffFilter {
  const [search] = useSearchParams();
  return { search: search.get('q') ?? '', origin: search.get('origin') ?? '', category: search.get('category') ?? '' };
}

export function FeedstuffFilters({ categories }: { categories: readonly string[] }) {
  const [, setSearch] = useSearchParams();
  const filter = useFeedstuffFilter();
  const set = (key: 'q' | 'origin' | 'category', value: string) =>
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        if (value === '') next.delete(key);
        else next.set(key, value);
        return next;
      },
      // Typing a word leaves one step to go back, not one for each letter.
      { replace: key === 'q' },
    );
  return (
    <div className={styles.filters} role="search">
      <TextField
        label="Search by name"
        type="search"
        value={filter.search}
        onChange={(event) => set('q', event.target.value)}
      />
      <SelectField
        label="From"
        emptyLabel="Book and own"
        options={origins}
        value={filter.origin}
        onChange={(event) => set('origin', event.target.value)}
      />
      <SelectField
        label="Category"
        emptyLabel="All categories"
        options={categories.map((category) => ({ value: category, label: categoryTitle(category) }))}
        value={filter.category}
        onChange={(event) => set('category', event.target.value)}
      />
    </div>
  );
}
