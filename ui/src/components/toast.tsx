import { createContext, use, useCallback, useEffect, useState, type ReactNode } from 'react';
import styles from './toast.module.css';

type ShowToast = (words: string) => void;

const ToastContext = createContext<ShowToast>(() => undefined);

/** For an act without a form: says that it is done. Faults of forms stay in their form. */
export const useToast = (): ShowToast => use(ToastContext);

// Long enough to read twice.
const SHOWN_MS = 8000;

export function ToastProvider({ children }: { children: ReactNode }) {
  const [toast, setToast] = useState<{ words: string; key: number } | null>(null);
  const showToast = useCallback<ShowToast>((words) => setToast({ words, key: Date.now() }), []);
  const hide = () => setToast(null);

  useEffect(() => {
    if (!toast) return undefined;
    const timer = setTimeout(() => setToast(null), SHOWN_MS);
    return () => clearTimeout(timer);
  }, [toast]);

  return (
    <ToastContext value={showToast}>
      {children}
      <div className={`${styles.region} no-print`} role="status">
        {toast && (
          <div key={toast.key} className={styles.toast}>
            {toast.words}
            <button type="button" className={styles.close} onClick={hide}>
              Close
            </button>
          </div>
        )}
      </div>
    </ToastContext>
  );
}
