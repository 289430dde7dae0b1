import '@testing-library/jest-dom/vitest';
import { cleanup, configure } from '@testing-library/react';

// Screens are fetched when they are first opened, which a busy machine takes its time over.
configure({ asyncUtilTimeout: 15_000 });

// jsdom has none of these, and the dialog and the theme read them.
window.matchMedia ??= ((media: string) => ({
  matches: false,
  media,
  onchange: null,
  addListener: () => undefined,
  removeListener: () => undefined,
  addEventListener: () => undefined,
  removeEventListener: () => undefined,
  dispatchEvent: () => false,
})) as typeof window.matchMedia;

globalThis.ResizeObserver ??= class {
  observe() {}
  unobserve() {}
  disconnect() {}
} as typeof ResizeObserver;

window.scrollTo = () => undefined;

// jsdom has the dialog element, but cannot open it.
HTMLDialogElement.prototype.showModal ??= function showModal(this: HTMLDialogElement) {
  this.open = true;
};
HTMLDialogElement.prototype.close ??= function close(this: HTMLDialogElement) {
  this.open = false;
};

// The files share one document, so each is told to leave it empty.
afterEach(cleanup);
