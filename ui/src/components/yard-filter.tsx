import { useSearchParams } from 'react-router-dom';
import { SelectField } from './select-field';
import styles from './yard-filter.module.css';

interface YardFilterProps {
  yards: readonly { id: string; name: string }[];
}

/** Narrows a list to one yard; the choice stands in the address. Nothing to choose, nothing shown. */
export function YardFilter({ yards }: YardFilterProps) {
  const [search, setSearch] = useSearchParams();
  if (yards.length < 2) return null;
  const handleChange = (yardId: string) =>
    setSearch((before) => {
      const next = new URLSearchParams(before);
      next.delete('cursor');
      if (yardId === '') next.delete('yard');
      else next.set('yard', yardId);
      return next;
    });
  return (
    <div className={styles.filter}>
      <SelectField
        label="Yard"
        emptyLabel="All yards"
        options={yards.map((yard) => ({ value: yard.id, label: yard.name }))}
        value={search.get('yard') ?? ''}
        onChange={(event) => handleChange(event.target.value)}
      />
    </div>
  );
}
