import type { RouteObject } from 'react-router-dom';
import { AppLayout, type RouteHandle } from './app/app-layout.tsx';
import { DoorLayout } from './app/door-layout.tsx';
import { RootErrorPage } from './app/root-error-page.tsx';
import { loadPage } from './lib/load-page.ts';
import { patterns } from './lib/paths.ts';

const wholeWindow: RouteHandle = { wholeWindow: true };
const open: RouteHandle = { open: true };

/** Every screen and its address; each page is fetched when it is first gone to. */
export const routes: RouteObject[] = [
  {
    errorElement: <RootErrorPage />,
    HydrateFallback: () => null,
    children: [
      {
        Component: DoorLayout,
        children: [
          {
            path: patterns.signIn,
            lazy: loadPage(
              () => import('./pages/sign-in-page.tsx'),
              (m) => m.SignInPage,
            ),
          },
          {
            path: patterns.signUp,
            lazy: loadPage(
              () => import('./pages/sign-up-page.tsx'),
              (m) => m.SignUpPage,
            ),
          },
        ],
      },
      {
        Component: AppLayout,
        children: [
          {
            path: patterns.today,
            lazy: loadPage(
              () => import('./pages/today-page.tsx'),
              (m) => m.TodayPage,
            ),
          },
          {
            path: patterns.sites,
            lazy: loadPage(
              () => import('./pages/sites-page.tsx'),
              (m) => m.SitesPage,
            ),
          },
          {
            path: patterns.newSite,
            lazy: loadPage(
              () => import('./pages/new-site-page.tsx'),
              (m) => m.NewSitePage,
            ),
          },
          {
            path: patterns.site,
            lazy: loadPage(
              () => import('./pages/site-page.tsx'),
              (m) => m.SitePage,
            ),
          },
          {
            path: patterns.survey,
            handle: wholeWindow,
            lazy: loadPage(
              () => import('./pages/book-page.tsx'),
              (m) => m.BookPage,
            ),
          },
          {
            path: patterns.workings,
            lazy: loadPage(
              () => import('./pages/workings-page.tsx'),
              (m) => m.WorkingsPage,
            ),
          },
          {
            path: patterns.catalogue,
            lazy: loadPage(
              () => import('./pages/catalogue-page.tsx'),
              (m) => m.CataloguePage,
            ),
          },
          {
            path: patterns.newMaterial,
            lazy: loadPage(
              () => import('./pages/new-material-page.tsx'),
              (m) => m.NewMaterialPage,
            ),
          },
          {
            path: patterns.material,
            lazy: loadPage(
              () => import('./pages/material-page.tsx'),
              (m) => m.MaterialPage,
            ),
          },
          {
            path: patterns.methods,
            handle: open,
            lazy: loadPage(
              () => import('./pages/methods-page.tsx'),
              (m) => m.MethodsPage,
            ),
          },
          {
            path: patterns.cautions,
            handle: open,
            lazy: loadPage(
              () => import('./pages/cautions-page.tsx'),
              (m) => m.CautionsPage,
            ),
          },
          {
            path: patterns.account,
            lazy: loadPage(
              () => import('./pages/account-page.tsx'),
              (m) => m.AccountPage,
            ),
          },
          {
            path: '*',
            lazy: loadPage(
              () => import('./pages/not-found-page.tsx'),
              (m) => m.NotFoundPage,
            ),
          },
        ],
      },
    ],
  },
];
