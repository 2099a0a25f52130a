import { useEffect, useRef } from 'react';
import { typeTapeKey } from '../../input/tapeEntry';

export interface TapeTyping {
  readonly value: string;
  readonly onChange: (text: string) => void;
  /** Null while what is typed can't be taken. */
  readonly onEnter: (() => void) | null;
}

/** A physical keyboard types into a length while no field has the focus; null: not now. */
export function useTapeTyping(typing: TapeTyping | null): void {
  const latest = useRef(typing);
  useEffect(() => {
    latest.current = typing;
  });
  useEffect(() => {
    /** Whether what was done last was typing: then Enter takes what was typed, whatever button has the focus. */
    let typed = false;

    function onKey(event: KeyboardEvent): void {
      const now = latest.current;
      const target = event.target instanceof HTMLElement ? event.target : null;
      if (!now || (target && /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName))) return;
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
      const onControl = target?.closest('button,[role=button],[role=radio],a') != null;
      if (event.key === 'Enter') {
        if ((onControl && !typed) || !now.onEnter || now.value === '') return;
        now.onEnter();
      } else {
        if (event.key === ' ' && onControl && !typed) return;
        const text = typeTapeKey(now.value, event.key);
        if (text === null || (text === '' && now.value === '')) return;
        typed = true;
        now.onChange(text);
      }
      event.preventDefault();
      event.stopPropagation();
    }

    function onOther(): void {
      typed = false;
    }

    // Before the button that has the focus hears of it.
    globalThis.addEventListener?.('keydown', onKey, { capture: true });
    globalThis.addEventListener?.('focusin', onOther);
    globalThis.addEventListener?.('pointerdown', onOther);
    return () => {
      globalThis.removeEventListener?.('keydown', onKey, { capture: true });
      globalThis.removeEventListener?.('focusin', onOther);
      globalThis.removeEventListener?.('pointerdown', onOther);
    };
  }, []);
}
