'use client';

import { type ReactNode, useEffect, useState } from 'react';
import { createPortal } from 'react-dom';

const slotId = 'save-state';

/** Place in the header for the line that says where the readings are ("On this device: 3 waiting · server 14:02"). */
export function SaveStateSlot() {
  return <div id={slotId} className="empty:hidden" />;
}

/** What stands inside appears in the header, and is read out politely when it changes. */
export function SaveState({ children }: { children: ReactNode }) {
  const [slot, setSlot] = useState<HTMLElement | null>(null);
  useEffect(() => setSlot(document.getElementById(slotId)), []);
  return slot ? createPortal(<div role="status">{children}</div>, slot) : null;
}
