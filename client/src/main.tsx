import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { Providers } from './app/providers';
import { router } from './app/router';
import { setFirstScheme } from './app/theme/first-scheme';
import './app/theme/fonts.css';

setFirstScheme();

const place = document.getElementById('root');
if (!place) throw new Error('The page has no place for the product.');

createRoot(place).render(
  <StrictMode>
    <Providers>
      <RouterProvider router={router} />
    </Providers>
  </StrictMode>,
);
