import type { RouteObject } from 'react-router-dom';

/** The way in for staff: sign-in, and the links of the first administrator and of invitations. */
export const entryRoutes: RouteObject[] = [];
