import { createBrowserRouter, Navigate } from 'react-router-dom';
import { RouteFault } from './RouteFault';
import { RoleGate, SignedOutGate, StartRedirect } from './gates';

/** Screens by role; each route module is loaded when it is needed and is on the phone once the application is. */
export const router = createBrowserRouter([
  {
    ErrorBoundary: RouteFault,
    HydrateFallback: () => null,
    children: [
      { index: true, Component: StartRedirect },
      {
        Component: SignedOutGate,
        children: [{ path: 'sign-in', lazy: () => import('../routes/sign-in-route') }],
      },
      {
        element: <RoleGate roles={['technician', 'supervisor', 'office', 'owner']} />,
        children: [{ path: 'settings', lazy: () => import('../routes/settings-route') }],
      },
      {
        element: <RoleGate roles={['technician', 'supervisor']} />,
        children: [
          {
            lazy: () => import('../routes/technician/layout-route'),
            children: [
              { path: 'today/:day?', lazy: () => import('../routes/technician/today-route') },
              { path: 'visit/:visitId/:step?', lazy: () => import('../routes/technician/visit-route') },
              { path: 'on-this-phone', lazy: () => import('../routes/technician/on-this-phone-route') },
            ],
          },
        ],
      },
      {
        element: <RoleGate roles={['supervisor', 'office', 'owner']} />,
        children: [
          {
            lazy: () => import('../routes/desk/layout-route'),
            children: [
              { path: 'review', lazy: () => import('../routes/desk/review-route') },
              { path: 'review/:visitId', lazy: () => import('../routes/desk/visit-record-route') },
            ],
          },
        ],
      },
      { path: '*', element: <Navigate to="/" replace /> },
    ],
  },
]);
