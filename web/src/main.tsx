import { ApolloProvider } from '@apollo/client/react';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter } from 'react-router-dom';
import { RouterProvider } from 'react-router-dom';
import { client } from './lib/apollo';
import { leaveWhenSignedOut } from './lib/leave-when-signed-out';
import { routes } from './router';
import './ui/styles/styles.css';

const router = createBrowserRouter(routes);
leaveWhenSignedOut(router);

createRoot(document.getElementById('root')!).render(
  <StrictMode>
    <ApolloProvider client={client}>
      <RouterProvider router={router} />
    </ApolloProvider>
  </StrictMode>,
);
