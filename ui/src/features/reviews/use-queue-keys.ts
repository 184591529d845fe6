import { useCallback, useEffect, useRef, useState, type RefObject } from 'react';

const STORED_AS = 'brimgate-queue-keys';
const isTyping = (target: EventTarget | null) =>
  target instanceof HTMLElement && target.closest('input, textarea, select, [contenteditable="true"]') !== null;

/**
 * j and k move the focus through the links of a list; Enter then opens, as on any link.
 *
 * Single letters get in the way of those who steer by voice, so they can be switched off; the choice is kept.
 */
export function useQueueKeys(): { list: RefObject<HTMLDivElement | null>; isOn: boolean; toggle: () => void } {
  const list = useRef<HTMLDivElement>(null);
  const [isOn, setIsOn] = useState(() => localStorage.getItem(STORED_AS) !== 'off');
  const toggle = useCallback(() => {
    setIsOn(!isOn);
    localStorage.setItem(STORED_AS, isOn ? 'off' : 'on');
  }, [isOn]);

  useEffect(() => {
    if (!isOn) return undefined;
    const handleKey = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      if (event.key === 'j' || event.key === 'k') moveFocus(list.current, event.key === 'j' ? 1 : -1);
    };
    document.addEventListener('keydown', handleKey);
    return () => document.removeEventListener('keydown', handleKey);
  }, [isOn]);

  return { list, isOn, toggle };
}

function moveFocus(list: HTMLElement | null, step: 1 | -1): void {
  const links = [...(list?.querySelectorAll('a') ?? [])];
  const focused = links.findIndex((link) => link === document.activeElement);
  const next = focused === -1 ? (step === 1 ? 0 : links.length - 1) : focused + step;
  links[Math.min(Math.max(next, 0), links.length - 1)]?.focus();
}
