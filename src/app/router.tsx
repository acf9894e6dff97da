import { createBrowserRouter } from 'react-router-dom';
import { ErrorPage } from '#client/routes/error-page.tsx';
import { NotFoundPage } from '#client/routes/not-found-page.tsx';
import { Waiting } from '#client/ui/state-panels.tsx';
import { SessionGate } from './session-gate.tsx';

/** Each page is fetched when it is first opened; the member page brings the calculation with it. */
export const router = createBrowserRouter([
  {
    errorElement: <ErrorPage />,
    hydrateFallbackElement: <Waiting what="the page" />,
    children: [
      { path: '/welcome/:token', lazy: () => import('#client/routes/welcome-page.tsx') },
      {
        element: <SessionGate />,
        children: [
          {
            errorElement: <ErrorPage />,
            children: [
              { path: '/', lazy: () => import('#client/routes/desk-page.tsx') },
              { path: '/account', lazy: () => import('#client/routes/account-page.tsx') },
              { path: '/gallery', lazy: () => import('#client/gallery/gallery-page.tsx') },
              { path: '/library', lazy: () => import('#client/routes/library-page.tsx') },
              {
                path: '/library/:book/:clause',
                lazy: () => import('#client/routes/clause-page.tsx'),
              },
              {
                path: '/projects/:projectId',
                lazy: () => import('#client/routes/project-page.tsx'),
              },
              {
                path: '/calculations/:calculationId',
                lazy: () => import('#client/routes/calculation-page.tsx'),
              },
              {
                path: '/calculations/:calculationId/basis',
                lazy: () => import('#client/routes/basis-page.tsx'),
              },
              {
                path: '/calculations/:calculationId/report',
                lazy: () => import('#client/routes/report-page.tsx'),
              },
              {
                path: '/calculations/:calculationId/members/:memberId',
                lazy: () => import('#client/routes/member-page.tsx'),
              },
              { path: '*', element: <NotFoundPage /> },
            ],
          },
        ],
      },
    ],
  },
]);
