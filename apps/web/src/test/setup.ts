import '@testing-library/jest-dom';
import { ObserverThatSeesNothing } from './observer-that-sees-nothing';
import { mediaThatDoesNotMatch } from './media-that-does-not-match';

// jsdom draws nothing: what measures, scrolls or paints gets a quiet stand-in.
Object.assign(window, {
  ResizeObserver: ObserverThatSeesNothing,
  IntersectionObserver: ObserverThatSeesNothing,
  matchMedia: mediaThatDoesNotMatch,
  scrollTo: jest.fn(),
});
Element.prototype.scrollTo = jest.fn();
Element.prototype.scrollIntoView = jest.fn();
HTMLCanvasElement.prototype.getContext = jest.fn(() => null);

beforeEach(() => {
  window.localStorage.clear();
  window.sessionStorage.clear();
});
