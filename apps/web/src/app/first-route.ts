import type { createBrowserRouter } from 'react-router-dom';

type Router = ReturnType<typeof createBrowserRouter>;

/** Resolves once the first page's own script has been fetched, so that nothing blank is drawn over the served HTML. */
export function whenFirstRouteIsThere(router: Router): Promise<void> {
  if (router.state.initialized) return Promise.resolve();
  return new Promise((done) => {
    const stop = router.subscribe(({ initialized }) => {
      if (!initialized) return;
      stop();
      done();
    });
  });
}
