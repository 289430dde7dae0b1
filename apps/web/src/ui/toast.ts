import { createSignal } from '../lib/signal';

export interface Toast {
  id: number;
  tone: 'done' | 'failed';
  words: string;
}

export const toasts = createSignal<readonly Toast[]>([]);

let count = 0;

/** Says in a few words what was done, or that it failed. */
export function toast(words: string, tone: Toast['tone'] = 'done'): void {
  count += 1;
  toasts.set([...toasts.get().slice(-2), { id: count, tone, words }]);
}

export function dismiss(id: number): void {
  toasts.set(toasts.get().filter((shown) => shown.id !== id));
}
