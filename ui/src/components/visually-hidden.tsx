import type { ReactNode } from 'react';

/** Read aloud, not drawn. */
export const VisuallyHidden = ({ children }: { children: ReactNode }) => (
  <span className="visually-hidden">{children}</span>
);
