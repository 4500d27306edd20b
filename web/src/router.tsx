import type { RouteObject } from 'react-router-dom';
import { Component as NotFound } from './routes/not-found';
import { Root } from './routes/root';
import { RouteError, StandAloneError } from './routes/route-error';
import { Loading } from './ui/loading';

/** Every page. A route module exports `Component` and, as it needs them, `loader` and `ErrorBoundary`. */
export const routes: RouteObject[] = [
  {
    Component: Root,
    ErrorBoundary: StandAloneError,
    HydrateFallback: Loading,
    children: [
      { path: '/sign-in', lazy: () => import('./routes/sign-in') },
      {
        id: 'signed-in',
        lazy: () => import('./routes/signed-in'),
        children: [
          {
            // Below the shell, so that a page that fails leaves the navigation standing.
            ErrorBoundary: RouteError,
            children: [
              { index: true, path: '/', lazy: () => import('./routes/landing') },
              {
                path: '/rounds/:roundId',
                children: [
                  { path: 'overview', lazy: () => import('./routes/round-overview') },
                  { path: 'candidates', lazy: () => import('./routes/round-candidates') },
                  { path: 'candidates/:candidateId/quotes', lazy: () => import('./routes/candidate-quotes') },
                  { path: 'quotes', lazy: () => import('./routes/round-quotes') },
                  { path: 'limits', lazy: () => import('./routes/round-limits') },
                  { path: 'scoring', lazy: () => import('./routes/round-scores') },
                  { path: 'frontier', lazy: () => import('./routes/round-frontier') },
                  { path: 'approval', lazy: () => import('./routes/round-selection') },
                ],
              },
            ],
          },
        ],
      },
      { path: '*', Component: NotFound },
    ],
  },
];
