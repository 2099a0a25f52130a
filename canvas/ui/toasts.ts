/** What the toast shows now: one at a time, the newest wins. */
export interface ToastMessage {
  readonly id: number;
  readonly text: string;
  readonly tone: 'plain' | 'caution';
  readonly action?: { readonly label: string; readonly onPress: () => void };
}

let current: ToastMessage | null = null;
let nextId = 1;
const listeners = new Set<() => void>();

function tell() {
  for (const listener of listeners) listener();
}

/** Says something in passing under the window's header, for a few seconds. */
export function toast(text: string, options: Partial<Pick<ToastMessage, 'tone' | 'action'>> = {}): void {
  current = { id: nextId++, text, tone: options.tone ?? 'plain', action: options.action };
  tell();
}

export function dismissToast(id: number): void {
  if (current?.id !== id) return;
  current = null;
  tell();
}

export function currentToast(): ToastMessage | null {
  return current;
}

export function watchToasts(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
