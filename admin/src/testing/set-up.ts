import '@testing-library/jest-dom/vitest';
import { cleanup } from '@testing-library/react';
import { afterEach, vi } from 'vitest';

// jsdom lacks these; the screens ask only whether they exist or call them without needing an answer.
Element.prototype.scrollIntoView = () => undefined;
Element.prototype.getAnimations ??= () => [];
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
