import { createBrowserRouter } from 'react-router-dom';
import { NotebookLayout } from './NotebookLayout';
import { PageProblem } from './PageProblem';
import { SignedInGate } from './SignedInGate';

/** Every page is a module of its own, fetched when it is gone to. */
export const router = createBrowserRouter([
  {
    errorElement: <PageProblem />,
    children: [
      { path: 'sign-in', lazy: () => import('../routes/sign-in') },
      { path: 'first-admin', lazy: () => import('../routes/first-admin') },
      {
        element: <SignedInGate />,
        children: [
          {
            element: <NotebookLayout />,
            children: [
              { index: true, lazy: () => import('../routes/today') },
              { path: 'sessions', lazy: () => import('../routes/sessions') },
              { path: 'sessions/new', lazy: () => import('../routes/new-session') },
              { path: 'sessions/:sessionId', lazy: () => import('../routes/session') },
              { path: 'files/:fileId', lazy: () => import('../routes/file') },
              { path: 'curves/:curveId', lazy: () => import('../routes/curve') },
              { path: 'samples', lazy: () => import('../routes/samples') },
              { path: 'samples/new', lazy: () => import('../routes/new-sample') },
              { path: 'samples/:sampleId', lazy: () => import('../routes/sample') },
              { path: 'requirements', lazy: () => import('../routes/requirements') },
              { path: 'requirements/new', lazy: () => import('../routes/new-requirement') },
              { path: 'requirements/:requirementId', lazy: () => import('../routes/requirement') },
              { path: 'tokens', lazy: () => import('../routes/tokens') },
            ],
          },
        ],
      },
    ],
  },
]);
