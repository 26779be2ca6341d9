import '@testing-library/jest-dom/vitest';
import { cleanup, configure } from '@testing-library/react';
import { afterEach, vi } from 'vitest';

// Finding by role walks a whole form; on two busy cores one look can take a second.
configure({ asyncUtilTimeout: 8000 });

// jsdom lacks these; the screens ask only whether they exist or call them without needing an answer.
Element.prototype.scrollIntoView = () => undefined;
Object.defineProperty(Element.prototype, 'getAnimations', { configurable: true, value: () => [] });
class NoResizes {
  observe() {}
  unobserve() {}
  disconnect() {}
}
vi.stubGlobal('ResizeObserver', NoResizes);

afterEach(() => {
  cleanup();
  localStorage.clear();
  sessionStorage.clear();
});
