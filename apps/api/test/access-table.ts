import type { Role } from '@lidwatch/contracts';

/** Who may call a route: everybody, or people of some roles. */
type Access = 'public' | readonly Role[];

const all = ['administrator', 'analyst', 'officer'] as const;
const administrator = ['administrator'] as const;
const analyst = ['analyst'] as const;
const officer = ['officer'] as const;
const keepers = ['administrator', 'analyst'] as const;

/** Every route and who may call it; a route that is not here fails the test, and so does a row without a route. */
export const accessTable: Record<string, Access> = {
  'GET /api/docs': 'public',
  'GET /api/docs/': 'public',
  'GET /api/docs/LICENSE': 'public',
  'GET /api/docs/docs/swagger-ui-init.js': 'public',
  'GET /api/docs/index.html': 'public',
  'GET /api/docs/swagger-ui-init.js': 'public',
  'GET /api/openapi.json': 'public',
  'GET /health/live': 'public',
  'GET /health/ready': 'public',

  'POST /api/auth/sign-in': 'public',
  'POST /api/auth/first-administrator': 'public',
  'POST /api/auth/invitations/accept': 'public',
  'GET /api/auth/link/:token': 'public',
  'GET /api/auth/me': all,
  'POST /api/auth/sign-out': all,
  'GET /api/users': administrator,
  'POST /api/users': administrator,
  'PATCH /api/users/:id': administrator,
  'POST /api/users/:id/retire': administrator,
  'POST /api/users/:id/password-link': administrator,
  'GET /api/activity': all,
  'GET /api/office': all,
  'PUT /api/office': administrator,

  'GET /api/districts': all,
  'GET /api/districts/:id': all,
  'POST /api/districts': administrator,
  'PATCH /api/districts/:id': administrator,
  'GET /api/towers': all,
  'GET /api/towers/:id': all,
  'POST /api/towers': keepers,
  'PATCH /api/towers/:id': keepers,
  'POST /api/towers/:id/sensors': keepers,
  'PATCH /api/sensors/:id': keepers,
  'GET /api/towers/:id/sources': keepers,
  'POST /api/towers/:id/sources': keepers,
  'PATCH /api/sources/:id': keepers,
  'POST /api/sources/:id/retire': keepers,
  'POST /api/sources/:id/collect': keepers,
  'GET /api/towers/:id/keys': keepers,
  'POST /api/towers/:id/keys': administrator,
  'DELETE /api/keys/:id': administrator,

  'POST /api/ingest/readings': 'public',
  'GET /api/imports': all,
  'GET /api/imports/:id/refused': all,
  'GET /api/overrides': all,
  'POST /api/overrides': analyst,
  'DELETE /api/overrides/:id': analyst,
  'GET /api/reworks': all,
  'GET /api/towers/:id/calendar': all,
  'GET /api/towers/:id/flags': all,
  'GET /api/towers/:id/raw': all,
  'GET /api/towers/:id/profile': all,
  'GET /api/towers/:id/profiles': all,
  'GET /api/towers/:id/pipeline': all,

  'GET /api/rules/measures': all,
  'GET /api/districts/:id/rules': all,
  'POST /api/districts/:id/rules': analyst,
  'POST /api/rules/:id/put-in-force': analyst,
  'GET /api/desk': all,
  'GET /api/districts/:id/history': all,
  'GET /api/proposals': all,
  'GET /api/proposals/:id': all,
  'POST /api/proposals/:id/confirm': analyst,
  'POST /api/proposals/:id/decline': analyst,
  'POST /api/proposals/:id/return': officer,
  'POST /api/proposals/:id/preview': ['analyst', 'officer'],
  'POST /api/proposals/:id/issue': officer,

  'GET /api/notices': all,
  'GET /api/notices/:id': all,
  'GET /api/notices/:id/deliveries': all,
  'POST /api/notices/preview': officer,
  'POST /api/notices': officer,
  'POST /api/notices/:id/end-preview': officer,
  'POST /api/notices/:id/end': officer,
  'GET /api/subscribers/counts': all,

  'POST /api/public/subscriptions': 'public',
  'POST /api/public/subscriptions/confirm': 'public',
  'GET /api/public/subscriptions/:token': 'public',
  'PATCH /api/public/subscriptions/:token': 'public',
  'POST /api/public/subscriptions/:token/leave': 'public',
  'GET /api/public/status': 'public',
  'GET /api/public/districts/:slug': 'public',
  'POST /api/hooks/sms/status': 'public',
  'POST /api/hooks/sms/incoming': 'public',
};
