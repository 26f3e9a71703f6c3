import type { RouteObject } from 'react-router-dom';

/** Pages for residents: plain elements and a stylesheet, without the design system. */
export const publicRoutes: RouteObject[] = [];
