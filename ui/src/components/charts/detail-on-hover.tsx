import { Popover } from '@radix-ui/themes';
import { useEffect, useRef, useState, type PointerEvent, type ReactNode } from 'react';
import styles from './detail-on-hover.module.css';

interface DetailOnHoverProps {
  /** What opens. */
  detail: ReactNode;
  /** Names what opens. */
  label: string;
  className?: string;
  children: ReactNode;
}

// Passing over a row on the way elsewhere opens nothing; leaving it for its detail closes nothing.
const OPEN_AFTER_MS = 250;
const CLOSE_AFTER_MS = 200;

/**
 * A button whose detail opens by pointing, and stays by pressing. What opens by pointing can be pointed at itself and is
 * dismissed with Escape; what was pressed open takes the focus.
 */
export function DetailOnHover({ detail, label, className, children }: DetailOnHoverProps) {
  const [state, setState] = useState<'closed' | 'pointed' | 'pressed'>('closed');
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const content = useRef<HTMLDivElement>(null);
  useEffect(() => () => clearTimeout(timer.current), []);

  const after = (ms: number, change: () => void) => {
    clearTimeout(timer.current);
    timer.current = setTimeout(change, ms);
  };
  const handleEnter = (event: PointerEvent) => {
    if (event.pointerType !== 'mouse') return;
    after(OPEN_AFTER_MS, () => setState((before) => (before === 'closed' ? 'pointed' : before)));
  };
  const handleLeave = () =>
    after(CLOSE_AFTER_MS, () => setState((before) => (before === 'pointed' ? 'closed' : before)));
  const handleOpenChange = (isOpen: boolean) => {
    clearTimeout(timer.current);
    setState(isOpen ? 'pressed' : 'closed');
  };

  return (
    <Popover.Root open={state !== 'closed'} onOpenChange={handleOpenChange}>
      <Popover.Trigger>
        <button
          type="button"
          className={className}
          onPointerEnter={handleEnter}
          onPointerLeave={handleLeave}
          onClick={(event) => {
            if (state !== 'pointed') return;
            // Already open by pointing: pressing keeps it open instead of toggling it shut.
            event.preventDefault();
            setState('pressed');
            content.current?.focus();
          }}
        >
          {children}
        </button>
      </Popover.Trigger>
      <Popover.Content
        ref={content}
        aria-label={label}
        className={styles.detail}
        size="2"
        onPointerEnter={handleEnter}
        onPointerLeave={handleLeave}
        onOpenAutoFocus={(event) => state === 'pointed' && event.preventDefault()}
        onCloseAutoFocus={(event) => state === 'pointed' && event.preventDefault()}
      >
        {detail}
      </Popover.Content>
    </Popover.Root>
  );
}
