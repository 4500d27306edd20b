import '@testing-library/jest-dom/vitest';
import { cleanup, configure } from '@testing-library/react';
import { afterEach } from 'vitest';

afterEach(cleanup);
// The first test of a page also waits for its modules to be compiled.
configure({ asyncUtilTimeout: 15_000 });
// Events go out as in a browser. Within a synchronous `act`, a page that reads a promise with `use` and takes longer than
// one slice to draw stays in act's queue, which nobody flushes: the page would then never change again.
configure({ eventWrapper: (dispatch): unknown => dispatch() });

// What jsdom lacks and Primer asks for.
window.matchMedia = (media: string) =>
  ({
    matches: false,
    media,
    onchange: null,
    addEventListener() {},
    removeEventListener() {},
    dispatchEvent: () => false,
  }) as unknown as MediaQueryList;

class NoObserver {
  observe() {}
  unobserve() {}
  disconnect() {}
  takeRecords() {
    return [];
  }
}
globalThis.ResizeObserver ??= NoObserver as unknown as typeof ResizeObserver;
globalThis.IntersectionObserver ??= NoObserver as unknown as typeof IntersectionObserver;
Element.prototype.scrollIntoView = () => undefined;
window.scrollTo = () => undefined;
document.adoptedStyleSheets ??= [];
(globalThis as { CSS?: unknown }).CSS ??= { supports: () => false, escape: (text: string) => text };
