import type { RationView } from '@brimgate/rules';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, useSyncExternalStore } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { DraftSaver } from './draft-saver';
import { fetchRation, rationListKey, rationQuery, saveRation } from './rations.queries';
import { type RationValues, rationValues } from './ration-values';

/** The ration's form with its saver: what is typed is saved by itself, and what others saved comes in. */
export function useRationEditor(ration: RationView) {
  const queryClient = useQueryClient();
  const form = useForm<RationValues>({ defaultValues: rationValues(ration.name, ration.draft) });
  const { control, reset, getValues } = form;
  const [saver] = useState(() => {
    const keep = (saved: RationView) => {
      queryClient.setQueryData(rationQuery(saved.id).queryKey, saved);
      void queryClient.invalidateQueries({ queryKey: rationListKey, refetchType: 'none' });
    };
    return new DraftSaver(ration, {
      save: (input, version) => saveRation(ration.id, input, version),
      fetchCurrent: () => fetchRation(ration.id),
      onSaved: keep,
      onMerged: (values, current) => {
        reset(values);
        keep(current);
      },
    });
  });
  const saveState = useSyncExternalStore(saver.subscribe, saver.state);
  const values = useWatch({ control }) as RationValues;

  useEffect(() => saver.change(values), [saver, values]);

  // A newer answer of the server, while nothing unsaved stands here: another act of mine, or somebody else's save.
  useEffect(() => {
    if (ration.version <= saver.version || saver.isDirty) return;
    const current = rationValues(ration.name, ration.draft);
    saver.adopt(ration, current);
    reset(current);
  }, [ration, saver, reset]);

  useEffect(() => {
    const handleLeave = (event: BeforeUnloadEvent) => {
      if (saver.isDirty) event.preventDefault();
    };
    window.addEventListener('beforeunload', handleLeave);
    return () => {
      window.removeEventListener('beforeunload', handleLeave);
      // Going to another page saves at once what was typed last; what cannot be saved was asked about before leaving.
      if (saver.isDirty) saver.flush().catch(() => undefined);
      saver.dispose();
    };
  }, [saver]);

  return { form, values, saver, saveState, getValues };
}

export type RationEditor = ReturnType<typeof useRationEditor>;
