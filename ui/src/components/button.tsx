import { Button as RadixButton } from '@radix-ui/themes';
import { useId, type ComponentProps, type MouseEvent, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import styles from './button.module.css';

type Kind = 'primary' | 'quiet';

/** Solid is the single primary action of a page; everything else is quiet. */
const look = (kind: Kind) =>
  kind === 'primary'
    ? ({ variant: 'solid', highContrast: true } as const)
    : ({ variant: 'outline', color: 'gray', highContrast: true } as const);

const classes = (kind: Kind, size: 'normal' | 'small') =>
  [styles.button, size === 'small' && styles.small, kind === 'primary' && styles.primary].filter(Boolean).join(' ');

interface ButtonProps extends Omit<ComponentProps<'button'>, 'color' | 'disabled'> {
  kind?: Kind;
  size?: 'normal' | 'small';
  /** Why it cannot be pressed, in words; it stays focusable so that everybody can find out. */
  disabledReason?: string | null;
  /** The act is under way: pressing again does nothing. The words say what is happening. */
  busyText?: string | false;
  children: ReactNode;
}

export function Button({
  kind = 'quiet',
  size = 'normal',
  disabledReason,
  busyText = false,
  type = 'button',
  onClick,
  children,
  ...rest
}: ButtonProps) {
  const reasonId = useId();
  const isHeld = Boolean(disabledReason) || busyText !== false;
  const handleClick = (event: MouseEvent<HTMLButtonElement>) => {
    if (isHeld) event.preventDefault();
    else onClick?.(event);
  };
  const button = (
    <RadixButton
      {...rest}
      {...look(kind)}
      type={type}
      size="2"
      className={`${classes(kind, size)} ${disabledReason ? styles.refused : ''}`}
      aria-disabled={isHeld || undefined}
      aria-describedby={disabledReason ? reasonId : rest['aria-describedby']}
      onClick={handleClick}
    >
      {busyText === false ? children : busyText}
    </RadixButton>
  );
  if (!disabledReason) return button;
  return (
    <span className={styles.wrap}>
      {button}
      <span id={reasonId} className={styles.reason}>
        {disabledReason}
      </span>
    </span>
  );
}

interface LinkButtonProps {
  to: string;
  kind?: Kind;
  size?: 'normal' | 'small';
  /** A file to keep, served by the API: not a page of ours. */
  download?: boolean;
  children: ReactNode;
}

/** A link that looks like a button: it goes somewhere, it does nothing. */
export function LinkButton({ to, kind = 'quiet', size = 'normal', download = false, children }: LinkButtonProps) {
  return (
    <RadixButton asChild {...look(kind)} size="2" className={classes(kind, size)}>
      {download ? (
        <a href={to} download>
          {children}
        </a>
      ) : (
        <Link to={to}>{children}</Link>
      )}
    </RadixButton>
  );
}
