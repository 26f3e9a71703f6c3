import type { RouteObject } from 'react-router-dom';

/** The administrator's pages, inside the staff frame. */
export const adminRoutes: RouteObject[] = [];
