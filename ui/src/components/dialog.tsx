import { Dialog as RadixDialog } from '@radix-ui/themes';
import type { ReactNode } from 'react';
import styles from './dialog.module.css';

interface DialogProps {
  isOpen: boolean;
  /** Asked to close by Escape, a click outside or the close button. */
  onClose: () => void;
  title: string;
  description?: ReactNode;
  children?: ReactNode;
  /** Buttons at the foot, when they are not part of a form among the children. */
  actions?: ReactNode;
}

/** Holds focus while it is open and gives it back afterwards. */
export function Dialog({ isOpen, onClose, title, description, children, actions }: DialogProps) {
  return (
    <RadixDialog.Root open={isOpen} onOpenChange={(open) => !open && onClose()}>
      <RadixDialog.Content className={styles.window} {...(description ? {} : { 'aria-describedby': undefined })}>
        <RadixDialog.Title className={styles.title}>{title}</RadixDialog.Title>
        {description && (
          <RadixDialog.Description className={styles.description} size="2">
            {description}
          </RadixDialog.Description>
        )}
        {children}
        {actions && <DialogActions>{actions}</DialogActions>}
      </RadixDialog.Content>
    </RadixDialog.Root>
  );
}

export const DialogActions = ({ children }: { children: ReactNode }) => (
  <div className={styles.actions}>{children}</div>
);
