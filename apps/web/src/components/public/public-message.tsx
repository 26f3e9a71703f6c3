import type { ReactNode } from 'react';

/** Something a resident has to know here and now, set off from the page. What went wrong is announced at once. */
export function PublicMessage({ wrong = false, children }: { wrong?: boolean; children: ReactNode }) {
  return (
    <div className={`message${wrong ? ' message-error' : ''}`} role={wrong ? 'alert' : 'status'}>
      {children}
    </div>
  );
}
