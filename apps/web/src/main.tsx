import '@fontsource/source-sans-3/400.css';
import '@fontsource/source-sans-3/600.css';
import './theme/tokens.css';
import './components/public/public.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { createAppRouter } from './app/router';
import { whenFirstRouteIsThere } from './app/first-route';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element with the id "root".');
const router = createAppRouter();

// The served answer stays in the page until the application can draw the same.
void whenFirstRouteIsThere(router).then(() =>
  createRoot(root).render(
    <StrictMode>
      <SWRConfig value={{ revalidateOnFocus: true }}>
        <RouterProvider router={router} />
      </SWRConfig>
    </StrictMode>,
  ),
);
