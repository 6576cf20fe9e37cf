import { createBrowserRouter } from 'react-router-dom';
import { Waiting } from '../components/waiting';
import { SignInPage } from '../features/session/sign-in-page';
import { FirstPage } from './first-page';
import { NotFoundPage } from './not-found-page';
import { PageFault } from './page-fault';
import { ShopLayout } from './shop-layout';

/** One page, one chunk: the list opens without waiting for the sheet's tools. */
export const router = createBrowserRouter([
  { path: '/', element: <FirstPage />, errorElement: <PageFault /> },
  { path: '/sign-in', element: <SignInPage />, errorElement: <PageFault /> },
  {
    path: '/shops/:shop',
    element: <ShopLayout />,
    hydrateFallbackElement: <Waiting words="Opening the shop" />,
    errorElement: <PageFault />,
    children: [
      {
        path: 'drawings',
        lazy: async () => ({ Component: (await import('../features/drawings/drawings-page')).DrawingsPage }),
      },
      {
        path: 'drawings/new',
        lazy: async () => ({
          Component: (await import('../features/drawings/start-drawing-page')).StartDrawingPage,
        }),
      },
      {
        path: 'drawings/:drawing/:revision',
        lazy: async () => ({ Component: (await import('./revision-layout')).RevisionLayout }),
        children: [
          {
            path: 'sizes',
            lazy: async () => ({ Component: (await import('../features/fill-in/fill-in-page')).FillInPage }),
          },
          {
            path: 'route',
            lazy: async () => ({ Component: (await import('../features/route/route-page')).RoutePage }),
          },
          {
            path: 'capacity',
            lazy: async () => ({ Component: (await import('../features/route/capacity-page')).CapacityPage }),
          },
          {
            path: 'sign-off',
            lazy: async () => ({
              Component: (await import('../features/sign-off/sign-off-page')).SignOffPage,
            }),
          },
        ],
      },
      {
        path: 'drawings/:drawing/:revision/print',
        lazy: async () => ({ Component: (await import('../features/print/print-page')).PrintPage }),
      },
      { path: '*', element: <NotFoundPage /> },
    ],
  },
  { path: '*', element: <NotFoundPage /> },
]);
