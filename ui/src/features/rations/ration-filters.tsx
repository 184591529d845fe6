import { useSearchParams } from 'react-router-dom';
import { SelectField } from '../../components/select-field';
import { YardFilter } from '../../components/yard-filter';
import styles from './ration-filters.module.css';
import { stateOptions } from './ration-state';

/** Narrows the list by yard and state; both stand in the address. */
export function RationFilters({ yards }: { yards: readonly { id: string; name: string }[] }) {
  const [search, setSearch] = useSearchParams();
  const handleState = (state: string) =>
    setSearch((before) => {
      const next = new URLSearchParams(before);
      next.delete('cursor');
      if (state === '') next.delete('state');
      else next.set('state', state);
      return next;
    });
  return (
    <div className={styles.filters}>
      <YardFilter yards={yards} />
      <div className={styles.state}>
        <SelectField
          label="State"
          emptyLabel="All states"
          options={stateOptions}
          value={search.get('state') ?? ''}
          onChange={(event) => handleState(event.target.value)}
        />
      </div>
    </div>
  );
}
