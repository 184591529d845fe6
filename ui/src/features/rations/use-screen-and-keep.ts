import type { RationView } from '@brimgate/rules';
import { useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { useToast } from '../../components/toast';
import { problemOf } from '../../lib/api-problem';
import type { Fault } from '../../lib/form/faults-to-form';
import { DraftNotSaved, type DraftSaver } from './draft-saver';
import { contentFromValues } from './ration-content';
import type { RationValues } from './ration-values';
import { useRationScreening } from './rations.queries';

interface ScreenAndKeepInput {
  ration: RationView;
  saver: DraftSaver;
  form: UseFormReturn<RationValues>;
  onRefused: (faults: Fault[]) => void;
}

/** Saves what is typed, has the server screen exactly that, and keeps the screening. */
export function useScreenAndKeep({ ration, saver, form, onRefused }: ScreenAndKeepInput) {
  const screening = useRationScreening(ration.id);
  const showToast = useToast();
  const [isRunning, setIsRunning] = useState(false);
  const [problem, setProblem] = useState<unknown>(null);

  const fail = (error: unknown) => {
    // The saver's own state says what it could not save, and where.
    if (error instanceof DraftNotSaved) return;
    const { status, errors } = problemOf(error);
    if (status === 422 && errors.length > 0) onRefused(errors);
    else setProblem(error);
  };

  const run = async () => {
    setProblem(null);
    const values = form.getValues();
    const content = contentFromValues(values);
    if (!content.isValid) return onRefused(content.faults);
    setIsRunning(true);
    try {
      // The name is not part of what is screened: it is saved with the draft, before.
      const version = await saver.flush();
      const kept = await screening.mutateAsync({ content: content.output, version });
      saver.adopt(kept, values);
      showToast('Screened and kept.');
    } catch (error) {
      fail(error);
    } finally {
      setIsRunning(false);
    }
  };

  return { run: () => void run(), isRunning, problem };
}

export type ScreenAndKeep = ReturnType<typeof useScreenAndKeep>;
