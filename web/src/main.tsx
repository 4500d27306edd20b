// First, because it declares the order of the cascade layers.
import './ui/styles/styles.css';
import { ApolloProvider } from '@apollo/client/react';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider, createBrowserRouter } from 'react-router-dom';
import { client } from './lib/apollo';
import { leaveWhenSignedOut } from './lib/leave-when-signed-out';
import { routes } from './router';

const router = createBrowserRouter(routes);
leaveWhenSignedOut(router);

createRoot(document.getElementById('root')!).render(
  <StrictMode>
    <ApolloProvider client={client}>
      <RouterProvider router={router} />
    </ApolloProvider>
  </StrictMode>,
);
