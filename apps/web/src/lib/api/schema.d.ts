/** Written by `npm run openapi` from the API's description; change the API, not this file. */
export interface paths {
  '/api/activity': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Activity.page'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/auth/sign-in': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Auth.signIn'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/auth/sign-out': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Auth.signOut'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/auth/me': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Auth.me'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/auth/link/{token}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Auth.link'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/auth/first-administrator': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Auth.firstAdministrator'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/auth/invitations/accept': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Auth.accept'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/users': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Users.list'];
    put?: never;
    post: operations['Users.invite'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/users/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch: operations['Users.change'];
    trace?: never;
  };
  '/api/users/{id}/retire': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Users.retire'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/users/{id}/password-link': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Users.passwordLink'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/reworks': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Reworks.list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Towers.list'];
    put?: never;
    post: operations['Towers.create'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Towers.get'];
    put?: never;
    post?: never;
    delete: operations['Towers.removeTower'];
    options?: never;
    head?: never;
    patch: operations['Towers.change'];
    trace?: never;
  };
  '/api/towers/{id}/sensors': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Towers.addSensor'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/sensors/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['Towers.removeSensor'];
    options?: never;
    head?: never;
    patch: operations['Towers.changeSensor'];
    trace?: never;
  };
  '/api/sensors/{id}/versions/{from}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['Towers.removeVersion'];
    options?: never;
    head?: never;
    patch: operations['Towers.moveVersion'];
    trace?: never;
  };
  '/api/towers/{id}/neighbours': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Towers.neighbours'];
    put: operations['Towers.setNeighbours'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/changes': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Towers.changes'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/keys': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Keys.list'];
    put?: never;
    post: operations['Keys.create'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/keys/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['Keys.revoke'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/sources': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Sources.list'];
    put?: never;
    post: operations['Sources.add'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/sources/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch: operations['Sources.change'];
    trace?: never;
  };
  '/api/sources/{id}/retire': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Sources.retire'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/districts': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Districts.list'];
    put?: never;
    post: operations['Districts.create'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/districts/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Districts.get'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch: operations['Districts.change'];
    trace?: never;
  };
  '/api/sources/{id}/collect': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Collect.collect'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/ingest/readings': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Ingest.readings'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Imports.list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Imports.get'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports/{id}/refused': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Imports.refused'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports/{id}/refused.csv': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Imports.download'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/imports/{id}/withdraw': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Imports.withdraw'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/profile': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Profiles.latest'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/profiles': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Profiles.range'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/pipeline': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Profiles.state'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/overrides': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Overrides.list'];
    put?: never;
    post: operations['Overrides.set'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/overrides/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post?: never;
    delete: operations['Overrides.undo'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/calendar': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Screening.calendar'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/flags': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Screening.flagged'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/raw': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Screening.readings'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/reading': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Screening.reading'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/towers/{id}/limits': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Limits.list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/sensors/{id}/limits': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put: operations['Limits.set'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/uploads': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Uploads.list'];
    put?: never;
    post: operations['Uploads.receive'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/uploads/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Uploads.get'];
    put?: never;
    post?: never;
    delete: operations['Uploads.remove'];
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/uploads/{id}/proposal': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Uploads.proposal'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/uploads/{id}/preview': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Uploads.preview'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/uploads/{id}/commit': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Uploads.commit'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/uploads/{id}/cancel': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Uploads.cancel'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/forecasts': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Forecasts.list'];
    put?: never;
    post: operations['Forecasts.enter'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/forecasts/skill': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Forecasts.skill'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/forecasts/table': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Forecasts.table'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/rules/measures': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Rules.measures'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/districts/{id}/rules': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Rules.list'];
    put?: never;
    post: operations['Rules.draft'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/rules/{id}/put-in-force': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Rules.putInForce'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/office': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Office.get'];
    put: operations['Office.set'];
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/subscribers/counts': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Subscribers.list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/public/subscriptions': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Subscriptions.subscribe'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/public/subscriptions/confirm': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Subscriptions.confirm'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/public/subscriptions/{token}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Subscriptions.view'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch: operations['Subscriptions.change'];
    trace?: never;
  };
  '/api/public/subscriptions/{token}/leave': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Subscriptions.leave'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/troubles': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Troubles.list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/notices': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Notices.page'];
    put?: never;
    post: operations['Notices.issue'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/notices/preview': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Notices.preview'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/notices/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Notices.detail'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/notices/{id}/deliveries': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Notices.deliveries'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/notices/{id}/end-preview': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Notices.previewEnd'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/notices/{id}/end': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Notices.end'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/proposals': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Proposals.page'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/proposals/{id}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Proposals.detail'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/proposals/{id}/confirm': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Proposals.confirm'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/proposals/{id}/decline': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Proposals.decline'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/proposals/{id}/return': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Proposals.return'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/proposals/{id}/preview': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Proposals.preview'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/proposals/{id}/issue': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get?: never;
    put?: never;
    post: operations['Proposals.issue'];
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/desk': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Desk.now'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/districts/{id}/history': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Desk.past'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/public/status': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['PublicStatus.list'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/api/public/districts/{slug}': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['PublicStatus.get'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/health/live': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Health.live'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
  '/health/ready': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Health.ready'];
    put?: never;
    post?: never;
    delete?: never;
    options?: never;
    head?: never;
    patch?: never;
    trace?: never;
  };
}
export type webhooks = Record<string, never>;
export interface components {
  schemas: {
    ActivityEntry: {
      seq: number;
      /** Format: date-time */
      at: string;
      /** @description A person's name, or `service`. */
      actor: string;
      act: string;
      subject: string;
      districtId: number | null;
      /** @description Links the entry to the one before it. */
      hash: string;
    };
    ActivityPage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['ActivityEntry'][];
    };
    SignIn: {
      /** Format: email */
      email: string;
      /** Format: password */
      password: string;
    };
    MyDistrict: {
      id: number;
      slug: string;
      name: string;
    };
    Me: {
      id: number;
      name: string;
      email: string;
      /** @enum {string} */
      role: 'administrator' | 'analyst' | 'officer';
      /** @description An officer's own districts; every district for the others. */
      districts: components['schemas']['MyDistrict'][];
    };
    LinkView: {
      /** @enum {string} */
      purpose: 'first-administrator' | 'invitation' | 'password';
      email?: string;
      name?: string;
    };
    FirstAdministrator: {
      token: string;
      name: string;
      /** Format: email */
      email: string;
      /** Format: password */
      password: string;
    };
    AcceptInvitation: {
      token: string;
      /** Format: password */
      password: string;
    };
    UserView: {
      id: number;
      email: string;
      name: string;
      /** @enum {string} */
      role: 'administrator' | 'analyst' | 'officer';
      /** @enum {string} */
      state: 'invited' | 'active' | 'retired';
      /** @description The districts an officer acts in. */
      districtIds: number[];
      /** Format: date-time */
      createdAt: string;
      /** Format: date-time */
      retiredAt?: string;
    };
    UserPage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['UserView'][];
    };
    InviteUser: {
      /** Format: email */
      email: string;
      name: string;
      /** @enum {string} */
      role: 'administrator' | 'analyst' | 'officer';
      districtIds?: number[];
    };
    InvitedUser: {
      user: components['schemas']['UserView'];
      /** @description Works once, for seven days. Hand it to this person only. */
      invitationUrl: string;
    };
    ChangeUser: {
      name?: string;
      /** @enum {string} */
      role?: 'administrator' | 'analyst' | 'officer';
      districtIds?: number[];
    };
    PasswordLink: {
      /** @description Works once, for a day. Hand it to this person only. */
      url: string;
    };
    DistrictTruthsChanged: {
      districtId: number;
      name: string;
      /** @description Blocks of the last 24 h for which the rule in force now says otherwise */
      truthsChanged: number;
    };
    ChangedFindings: {
      /** @description Blocks whose profile or findings differ */
      blocksChanged: number;
      presentToAbsent: number;
      absentToPresent: number;
      toNotKnown: number;
      fromNotKnown: number;
      /** @description Inversions that were sure and are not any more */
      toNotSure: number;
      /** @description Inversions that were not sure and now are */
      toSure: number;
      /** @description Within the tower, °C; null where none was present */
      strongestBeforeC: number | null;
      /** @description Within the tower, °C; null where none was present */
      strongestAfterC: number | null;
      inversionHoursBefore: number;
      inversionHoursAfter: number;
      districts: components['schemas']['DistrictTruthsChanged'][];
    };
    Rework: {
      id: number;
      towerId: number;
      /** @description What was changed, in words */
      cause: string;
      /** @description null: the service itself */
      by: string | null;
      /** @description Begin of the first block concerned */
      from: string;
      /** @description End of the last block concerned */
      to: string;
      begunAt: string;
      endedAt: string | null;
      /** @description Blocks to be worked out anew */
      blocks: number;
      /** @description The tower's blocks that still wait */
      pending: number;
      /** @description The districts' blocks that still wait */
      pendingDistricts: number;
      /** @description null until it has ended */
      changes: components['schemas']['ChangedFindings'] | null;
    };
    SensorVersion: {
      /** @description null: from the beginning */
      from: string | null;
      heightM: number;
      /** @description One standard deviation, in the unit */
      sigma: number;
      pairSigma: number | null;
      offset: number;
      gain: number;
      note: string;
    };
    Sensor: {
      id: number;
      towerId: number;
      /** @description The column name of the sensor's readings */
      name: string;
      /** @enum {string} */
      quantity:
        | 'air temperature'
        | 'relative humidity'
        | 'dew point'
        | 'wet bulb'
        | 'wind speed'
        | 'wind direction'
        | 'station pressure'
        | 'pm2.5';
      unit: string;
      heightM: number;
      sigma: number;
      pairSigma: number | null;
      offset: number;
      gain: number;
      retired: boolean;
      versions: components['schemas']['SensorVersion'][];
    };
    Tower: {
      id: number;
      slug: string;
      name: string;
      elevationM: number;
      latitude: number;
      longitude: number;
      intervalMinutes: number;
      blockMinutes: number;
      staleLimitMinutes: number | null;
      clock: string;
      /** @enum {string} */
      stamp: 'instant' | 'start' | 'middle' | 'end';
      /** @enum {string} */
      screening: 'full' | 'report-only';
      /** @enum {string} */
      inversionForm: 'plain' | 'sensor-aware';
      embedDepthM: number;
      retired: boolean;
      sensors: components['schemas']['Sensor'][];
      version: number;
    };
    TowerInput: {
      slug?: string;
      name: string;
      /** @description Ground above sea level, m */
      elevationM: number;
      latitude: number;
      longitude: number;
      /** @description The logger's interval */
      intervalMinutes: number;
      /** @description A whole multiple of the interval; 15 where the interval divides 15, else the interval */
      blockMinutes?: number;
      staleLimitMinutes?: number | null;
      /**
       * @description UTC, a fixed offset such as -07:00, or an IANA zone
       * @default UTC
       */
      clock: string;
      /**
       * @default end
       * @enum {string}
       */
      stamp: 'instant' | 'start' | 'middle' | 'end';
      /**
       * @default full
       * @enum {string}
       */
      screening: 'full' | 'report-only';
      /**
       * @default sensor-aware
       * @enum {string}
       */
      inversionForm: 'plain' | 'sensor-aware';
      /**
       * @description Decreases thinner than this are passed over, m
       * @default 0
       */
      embedDepthM: number;
    };
    TowerPatch: {
      slug?: string;
      name?: string;
      /** @description Ground above sea level, m */
      elevationM?: number;
      latitude?: number;
      longitude?: number;
      /** @description The logger's interval */
      intervalMinutes?: number;
      /** @description A whole multiple of the interval; 15 where the interval divides 15, else the interval */
      blockMinutes?: number;
      staleLimitMinutes?: number | null;
      /**
       * @description UTC, a fixed offset such as -07:00, or an IANA zone
       * @default UTC
       */
      clock: string;
      /**
       * @default end
       * @enum {string}
       */
      stamp: 'instant' | 'start' | 'middle' | 'end';
      /**
       * @default full
       * @enum {string}
       */
      screening: 'full' | 'report-only';
      /**
       * @default sensor-aware
       * @enum {string}
       */
      inversionForm: 'plain' | 'sensor-aware';
      /**
       * @description Decreases thinner than this are passed over, m
       * @default 0
       */
      embedDepthM: number;
      /** @description The version that was read */
      version: number;
      /** @description true sets the tower aside: its readings stay, new ones are not taken */
      retired?: boolean;
    };
    SensorInput: {
      /** @description The column name of the sensor's readings */
      name: string;
      /** @enum {string} */
      quantity:
        | 'air temperature'
        | 'relative humidity'
        | 'dew point'
        | 'wet bulb'
        | 'wind speed'
        | 'wind direction'
        | 'station pressure'
        | 'pm2.5';
      /** @description The quantity's unit; it may be left out */
      unit?: string;
      /** @description Above ground, m */
      heightM: number;
      /** @description One standard deviation, in the unit */
      sigma?: number;
      /** @description Limits as the data sheet gives them (± this), in the unit */
      limits?: number;
      /** @description Standard deviation of the difference to its matched sensor, °C */
      pairSigma?: number;
      /**
       * @description corrected = gain × reading + offset
       * @default 0
       */
      offset: number;
      /** @default 1 */
      gain: number;
      /** @description Holds for readings after this instant; from the beginning when left out */
      from?: string;
      note?: string;
    };
    SensorPatch: {
      /** @description The column name of the sensor's readings */
      name?: string;
      /** @description Above ground, m */
      heightM?: number;
      /** @description One standard deviation, in the unit */
      sigma?: number;
      /** @description Limits as the data sheet gives them (± this), in the unit */
      limits?: number;
      /** @description Standard deviation of the difference to its matched sensor, °C */
      pairSigma?: number;
      /**
       * @description corrected = gain × reading + offset
       * @default 0
       */
      offset: number;
      /** @default 1 */
      gain: number;
      /** @description Holds for readings after this instant; from the beginning when left out */
      from?: string;
      note?: string;
      /** @description true sets the sensor aside: its readings stay, new ones are not taken */
      retired?: boolean;
    };
    VersionDateInput: {
      from: string;
    };
    Neighbours: {
      /** @description Ids of other towers, at most 8 */
      towerIds: number[];
    };
    TowerChange: {
      id: number;
      at: string;
      /** @description Who, or "service" */
      by: string;
      /** @description What was done, as a short phrase */
      act: string;
      /** @description What exactly, from what to what where that is kept; may be empty */
      what: string;
    };
    TowerChangePage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['TowerChange'][];
    };
    IngestKey: {
      id: number;
      name: string;
      createdAt: string;
      lastUsedAt: string | null;
      revokedAt: string | null;
    };
    KeyInput: {
      /** @example mast logger */
      name: string;
    };
    KeyMade: {
      id: number;
      /** @description Keep it now: it is never shown again */
      key: string;
    };
    TimeColumn: {
      column: string;
      /** @enum {string} */
      part:
        | 'date'
        | 'time'
        | 'year'
        | 'two-digit year'
        | 'month'
        | 'day'
        | 'day of year'
        | 'hour'
        | 'minute'
        | 'hhmm';
    };
    RowsLeftOut: {
      column: string;
      values: string[];
    };
    Mapping: {
      /**
       * @default wide
       * @enum {string}
       */
      format: 'wide' | 'long';
      /**
       * @description One character, or "blank" for runs of blanks
       * @default ,
       */
      separator: string;
      /**
       * @default .
       * @enum {string}
       */
      decimal: '.' | ',';
      /** @description 0: no header, columns are "1", "2", …; left out: the first line */
      headerRow?: number;
      /** @description Where lines stand between the header and the first reading */
      firstDataRow?: number;
      /** @default time */
      timeColumn: string;
      /** @description Where the time stands in several columns; wins over timeColumn */
      timeColumns?: components['schemas']['TimeColumn'][];
      /**
       * @default iso
       * @enum {string}
       */
      timeForm: 'iso' | 'day/month/year' | 'month/day/year' | 'epoch-seconds' | 'epoch-milliseconds';
      /** @description Marks for "no reading"; the empty cell always is one */
      missing?: string[];
      /** @description Header → sensor name, where they differ */
      columns?: Record<string, never>;
      /** @description Take only what columns names; else what is called as a sensor, too */
      onlyNamed?: boolean;
      /** @description Rows passed over, such as a day's summary */
      leaveOut?: components['schemas']['RowsLeftOut'][];
      /** @description Column (wide) or sensor as written (long) → its unit, where it is not the sensor's own: °F, K, 0–1, mph, km/h, kn, Pa, kPa, mmHg, inHg, mg/m³ */
      units?: Record<string, never>;
      /** @default sensor */
      sensorColumn: string;
      /** @default value */
      valueColumn: string;
      /** @description Where it differs from the tower's */
      clock?: string;
      /**
       * @description Where it differs from the tower's
       * @enum {string}
       */
      stamp?: 'instant' | 'start' | 'middle' | 'end';
      /**
       * @description A civil time that happens twice
       * @default refuse
       * @enum {string}
       */
      repeatedHour: 'refuse' | 'first' | 'second' | 'in-order';
      /**
       * @description A civil time that does not exist
       * @default refuse
       * @enum {string}
       */
      missingHour: 'refuse' | 'later';
      /** @description Spreadsheets: the sheet; left out: the first that is not hidden */
      sheet?: string;
    };
    Source: {
      id: number;
      towerId: number;
      /** @enum {string} */
      kind: 'folder' | 'http' | 'push';
      path: string | null;
      url: string | null;
      /** @enum {string} */
      auth: 'none' | 'basic' | 'bearer';
      /** @description Whether credentials are kept */
      hasSecret: boolean;
      mapping: components['schemas']['Mapping'];
      intervalSeconds: number;
      /** @description Whether it is being collected right now */
      collecting: boolean;
      lastAt: string | null;
      /** @description The last time it could be collected */
      lastOkAt: string | null;
      /** @description What the last collection gave, or why it failed */
      lastResult: string | null;
      /** @description Failures in a row */
      failures: number;
      /** @description When the present row of failures began */
      failingSince: string | null;
      nextAt: string | null;
      /** @description Counts changes; a change names the one it began from */
      version: number;
    };
    SourceInput: {
      /** @enum {string} */
      kind: 'folder' | 'http' | 'push';
      /** @description folder: a file or folder beneath the loggers' folder */
      path?: string;
      /** @description http: the address of the file, at a host of HTTP_SOURCE_HOSTS */
      url?: string;
      /**
       * @default none
       * @enum {string}
       */
      auth: 'none' | 'basic' | 'bearer';
      /** @description basic: kept sealed and never shown again */
      username?: string;
      /** @description basic: kept sealed and never shown again */
      password?: string;
      /** @description bearer: kept sealed and never shown again */
      token?: string;
      mapping?: components['schemas']['Mapping'];
      /**
       * @description At least 10 for a folder, 60 over HTTP
       * @default 60
       */
      intervalSeconds: number;
    };
    SourcePatch: {
      /** @description folder: a file or folder beneath the loggers' folder */
      path?: string;
      /** @description http: the address of the file, at a host of HTTP_SOURCE_HOSTS */
      url?: string;
      /**
       * @default none
       * @enum {string}
       */
      auth: 'none' | 'basic' | 'bearer';
      /** @description basic: kept sealed and never shown again */
      username?: string;
      /** @description basic: kept sealed and never shown again */
      password?: string;
      /** @description bearer: kept sealed and never shown again */
      token?: string;
      mapping?: components['schemas']['Mapping'];
      /**
       * @description At least 10 for a folder, 60 over HTTP
       * @default 60
       */
      intervalSeconds: number;
      /** @description The version the change began from */
      version: number;
    };
    DistrictTower: {
      towerId: number;
      /** @description Whether what this tower shows may begin a finding */
      mayBegin: boolean;
      /** @description Whether what this tower shows may end a finding */
      mayEnd: boolean;
    };
    District: {
      id: number;
      slug: string;
      name: string;
      /** @example America/Denver */
      timeZone: string;
      latitude: number;
      longitude: number;
      elevationM: number | null;
      population: number | null;
      areaText: string;
      ordinanceRef: string;
      contactPhone: string;
      /** @enum {string} */
      combine: 'first-fresh' | 'any' | 'all' | 'median';
      towers: components['schemas']['DistrictTower'][];
      floorTowerId: number | null;
      benchTowerId: number | null;
      pm25TowerId: number | null;
      version: number;
    };
    DistrictTowerInput: {
      towerId: number;
      /** @default true */
      mayBegin: boolean;
      /** @default true */
      mayEnd: boolean;
    };
    DistrictInput: {
      /** @description Address part of the public page; from the name when left out */
      slug?: string;
      name: string;
      /** @example America/Denver */
      timeZone: string;
      latitude: number;
      longitude: number;
      elevationM?: number | null;
      population?: number | null;
      areaText?: string;
      ordinanceRef?: string;
      contactPhone?: string;
      /**
       * @default first-fresh
       * @enum {string}
       */
      combine: 'first-fresh' | 'any' | 'all' | 'median';
      /** @description In the order in which they are asked */
      towers?: components['schemas']['DistrictTowerInput'][];
      floorTowerId?: number | null;
      benchTowerId?: number | null;
      pm25TowerId?: number | null;
    };
    DistrictPatch: {
      /** @description Address part of the public page; from the name when left out */
      slug?: string;
      name?: string;
      /** @example America/Denver */
      timeZone?: string;
      latitude?: number;
      longitude?: number;
      elevationM?: number | null;
      population?: number | null;
      areaText?: string;
      ordinanceRef?: string;
      contactPhone?: string;
      /**
       * @default first-fresh
       * @enum {string}
       */
      combine: 'first-fresh' | 'any' | 'all' | 'median';
      /** @description In the order in which they are asked */
      towers?: components['schemas']['DistrictTowerInput'][];
      floorTowerId?: number | null;
      benchTowerId?: number | null;
      pm25TowerId?: number | null;
      /** @description The version that was read */
      version: number;
    };
    RefusedRowShown: {
      /** @description The header is row 1; in JSON the place in the list, from 1 */
      row: number;
      column: string | null;
      code: string;
      /** @description Names the row, the column and the cure */
      text: string;
    };
    IngestResult: {
      importId: number;
      new: number;
      /** @description Known already; nothing changed */
      repeated: number;
      /** @description Took the place of another value */
      corrected: number;
      refused: number;
      /** @description The first 100 */
      refusedRows: components['schemas']['RefusedRowShown'][];
      /** @description Columns that no sensor of the tower has */
      ignoredColumns: string[];
    };
    Import: {
      id: number;
      towerId: number;
      towerName: string;
      /** @enum {string} */
      origin: 'folder' | 'push' | 'http' | 'upload' | 'demo';
      name: string;
      receivedAt: string;
      new: number;
      repeated: number;
      corrected: number;
      refused: number;
      /** @enum {string} */
      state: 'running' | 'done' | 'cancelled' | 'failed' | 'withdrawing' | 'withdrawn';
      /** @description Who sent it; null where a machine did */
      by: string | null;
      withdrawnAt: string | null;
      withdrawnBy: string | null;
      /** @description Whether it can be taken back as a whole */
      canWithdraw: boolean;
    };
    ImportPage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['Import'][];
    };
    RefusedRow: {
      /** @description The header is row 1; in JSON the place in the list, from 1 */
      row: number;
      column: string | null;
      code: string;
      /** @description Names the row, the column and the cure */
      text: string;
      raw: string;
    };
    RefusedRowPage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['RefusedRow'][];
    };
    WithdrawInput: {
      reason: string;
    };
    ProfileLevel: {
      heightM: number;
      temperatureC: number | null;
      sigmaC: number;
      /** @description Readings in the mean */
      n: number;
      /** @enum {string} */
      quality: 'valid' | 'suspect' | 'failed' | 'missing';
    };
    ProfileLayer: {
      lowerM: number;
      upperM: number;
      /** @description −dT/dz: positive where it cools upward */
      lapseRateKPerKm: number | null;
      sigmaKPerKm: number | null;
      textbookClass: string | null;
      probabilityTRises: number | null;
      /** @description Moist-adiabatic rate at its temperature and pressure */
      moistLapseRateKPerKm: number | null;
      superadiabatic: boolean | null;
      autoconvective: boolean | null;
    };
    RangeValue: {
      exactly?: number;
      atLeast?: number;
      atMost?: number;
      between?: number[];
      /** @description The reason, in plain words */
      notKnown?: string;
    };
    SurfaceInversion: {
      baseM: number;
      /** @description The lowest level at which its top can lie */
      topM: number;
      depthM: components['schemas']['RangeValue'];
      strengthC: components['schemas']['RangeValue'];
      strengthWithinTowerC: number;
      sigmaC: number | null;
      /** @description P(strength > 0) */
      probability: number | null;
      gradientCPer100m: number;
      /** @enum {string} */
      open: 'no' | 'at the top' | 'cut by a missing level';
      /** @description A missing level lies just below */
      baseAtOrBelow: boolean;
      sure: boolean;
      /** @enum {string} */
      form: 'plain' | 'sensor-aware';
    };
    ElevatedInversion: {
      baseM: number;
      topM: number;
      strengthC: components['schemas']['RangeValue'];
      sure: boolean;
    };
    Profile: {
      towerId: number;
      /** @description End of the block */
      tEnd: string;
      blockMinutes: number;
      /** @description Counts how often it was worked out anew with another result */
      rev: number;
      levels: components['schemas']['ProfileLevel'][];
      /** @description Between each two neighbouring levels the tower has */
      layers: components['schemas']['ProfileLayer'][];
      /** @enum {string} */
      surface: 'present' | 'absent' | 'not known';
      /** @description Why the surface finding is not known */
      reason?: string;
      inversion: components['schemas']['SurfaceInversion'] | null;
      elevated: components['schemas']['ElevatedInversion'][];
      stableDepthM: components['schemas']['RangeValue'];
      heatDeficitMJPerM2: components['schemas']['RangeValue'];
      breakUpTemperatureC: components['schemas']['RangeValue'];
      pressureHpa: number;
      /** @description The standard atmosphere’s, none being measured */
      pressureAssumed: boolean;
      relativeHumidityPct?: number;
      windSpeedMPerS?: number;
      windDirectionDeg?: number;
      /** @description Block mean, µg/m³ */
      pm25?: number;
      /** @description Mean of the hour that ends with the block, µg/m³ */
      pm25Hour?: number;
    };
    ProfileSpan: {
      items: components['schemas']['Profile'][];
      /** @description Ask again with `from` set to this for what follows */
      next?: string;
    };
    PipelineState: {
      /** @description Blocks that ended and wait; 0 when everything is worked out */
      pending: number;
    };
    Override: {
      id: number;
      sensorId: number;
      sensorName: string;
      from: string;
      to: string;
      /** @enum {string} */
      quality: 'valid' | 'failed';
      reason: string;
      by: string;
      at: string;
      undoneBy: string | null;
      undoneAt: string | null;
    };
    OverrideInput: {
      sensorId: number;
      /** @description End of the first reading of the span */
      from: string;
      /** @description End of the last reading of the span */
      to: string;
      /** @enum {string} */
      quality: 'valid' | 'failed';
      /** @description Why; it is kept with your name */
      reason: string;
    };
    SeenSensor: {
      sensorId: number;
      name: string;
      /** @enum {string} */
      quantity:
        | 'air temperature'
        | 'relative humidity'
        | 'dew point'
        | 'wet bulb'
        | 'wind speed'
        | 'wind direction'
        | 'station pressure'
        | 'pm2.5';
      unit: string;
      /** @description Above ground, as it is now */
      heightM: number;
    };
    DayOfSensor: {
      sensorId: number;
      /** @description By the tower's interval, from its first reading up to now */
      expected: number;
      taken: number;
      suspect: number;
      failed: number;
      /** @description Readings that can be used (taken and not failed) of those expected; null where none is */
      completenessPercent: number | null;
    };
    CalendarDay: {
      /** @example 2026-01-31 */
      day: string;
      from: string;
      to: string;
      /** @description In the order of the sensors */
      sensors: components['schemas']['DayOfSensor'][];
    };
    TowerCalendar: {
      towerId: number;
      /** @description That of the tower's first district; UTC where it has none */
      timeZone: string;
      sensors: components['schemas']['SeenSensor'][];
      days: components['schemas']['CalendarDay'][];
    };
    FlaggedSpan: {
      sensorId: number;
      sensorName: string;
      /** @enum {string} */
      check:
        | 'range'
        | 'spike'
        | 'step'
        | 'persistence'
        | 'internal consistency'
        | 'vertical consistency'
        | 'neighbours'
        | 'override'
        | 'stuck'
        | 'clock';
      /** @description What the check found, in plain words with its limits */
      says: string;
      /**
       * @description The worst of its readings
       * @enum {string}
       */
      quality: 'valid' | 'suspect' | 'failed' | 'missing';
      /** @description End of the first reading */
      from: string;
      /** @description End of the last reading */
      to: string;
      readings: number;
      /** @description Whose word holds instead of the check */
      setBy: string | null;
    };
    FlaggedSpanPage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['FlaggedSpan'][];
    };
    RawReading: {
      /** @description End of its interval */
      t: string;
      /** @description As it came */
      value: number;
      /** @description With the correction of its time; left out where there is none */
      corrected?: number;
      /** @enum {string} */
      quality: 'valid' | 'suspect' | 'failed' | 'missing';
      /** @description What spoke of it */
      checks?: (
        | 'range'
        | 'spike'
        | 'step'
        | 'persistence'
        | 'internal consistency'
        | 'vertical consistency'
        | 'neighbours'
        | 'override'
        | 'stuck'
        | 'clock'
      )[];
    };
    RawSeries: {
      sensorId: number;
      name: string;
      /** @enum {string} */
      quantity:
        | 'air temperature'
        | 'relative humidity'
        | 'dew point'
        | 'wet bulb'
        | 'wind speed'
        | 'wind direction'
        | 'station pressure'
        | 'pm2.5';
      unit: string;
      /** @description Above ground, as it is now */
      heightM: number;
      /** @description How many there are */
      readings: number;
      suspect: number;
      failed: number;
      /** @description Fewer are given: the extremes of each part of the time, and what is flagged */
      thinned: boolean;
      points: components['schemas']['RawReading'][];
    };
    RawReadings: {
      towerId: number;
      timeZone: string;
      from: string;
      to: string;
      sensors: components['schemas']['RawSeries'][];
    };
    SaidOfReading: {
      /** @enum {string} */
      check:
        | 'range'
        | 'spike'
        | 'step'
        | 'persistence'
        | 'internal consistency'
        | 'vertical consistency'
        | 'neighbours'
        | 'override'
        | 'stuck'
        | 'clock';
      /** @description In plain words with its limits */
      says: string;
    };
    WordOnReading: {
      /** @enum {string} */
      quality: 'valid' | 'failed';
      by: string;
      at: string;
      reason: string;
    };
    ReadingOrigin: {
      importId: number;
      /** @description Of the file, or of the key that pushed it */
      name: string;
      origin: string;
      receivedAt: string;
      /** @description The row of the file */
      rowNo: number;
    };
    EarlierValue: {
      value: number;
      /** @description Until when it was in force */
      until: string;
      from: components['schemas']['ReadingOrigin'];
    };
    ReadingDetail: {
      sensorId: number;
      sensorName: string;
      unit: string;
      t: string;
      /** @description As it came */
      value: number;
      /** @description With the correction of its time */
      corrected: number;
      /** @enum {string} */
      quality: 'valid' | 'suspect' | 'failed' | 'missing';
      checks: components['schemas']['SaidOfReading'][];
      word: components['schemas']['WordOnReading'] | null;
      from: components['schemas']['ReadingOrigin'];
      /** @description The newest first */
      earlier: components['schemas']['EarlierValue'][];
    };
    LimitRange: {
      lowest: number;
      highest: number;
    };
    LevelDifference: {
      /** @description Warmer than the level below by more, °C */
      riseC: number;
      /** @description Colder than the level below by more, °C */
      fallC: number;
      /** @description Warmer by day by more, °C/m */
      risePerMetreByDayC: number;
      /** @description Colder at night by more, °C/m */
      fallPerMetreAtNightC: number;
    };
    CheckLimits: {
      /** @description What is expected here; beyond it: suspect */
      plausible: components['schemas']['LimitRange'] | null;
      /** @description A single reading further off than this: failed */
      spike: number | null;
      /** @description The very same value for so many hours: failed */
      stuckHours: number | null;
      /** @description Further than this from the median of the neighbouring towers: suspect */
      neighbourDifference: number | null;
      /** @description Air temperature alone: what is unusual from the level below to this one; suspect */
      levelDifference: components['schemas']['LevelDifference'] | null;
      /** @description Whether changes faster than usual are suspect */
      fastChanges: boolean;
      /** @description Whether hours without any change to speak of are suspect */
      steadiness: boolean;
    };
    SensorLimits: {
      sensorId: number;
      sensorName: string;
      unit: string;
      /** @description What is possible; beyond it: failed, always */
      physical: components['schemas']['LimitRange'];
      limits: components['schemas']['CheckLimits'];
      usual: components['schemas']['CheckLimits'];
    };
    LimitsInput: {
      /** @description What is expected here; beyond it: suspect */
      plausible: components['schemas']['LimitRange'] | null;
      /** @description A single reading further off than this: failed */
      spike: number | null;
      /** @description The very same value for so many hours: failed */
      stuckHours: number | null;
      /** @description Further than this from the median of the neighbouring towers: suspect */
      neighbourDifference: number | null;
      /** @description Air temperature alone: what is unusual from the level below to this one; suspect */
      levelDifference: components['schemas']['LevelDifference'] | null;
      /** @description Whether changes faster than usual are suspect */
      fastChanges: boolean;
      /** @description Whether hours without any change to speak of are suspect */
      steadiness: boolean;
      /** @description Why; it is kept with your name */
      reason: string;
    };
    SameImport: {
      importId: number;
      receivedAt: string;
    };
    Upload: {
      id: number;
      towerId: number;
      towerName: string;
      name: string;
      /** @enum {string} */
      kind: 'text' | 'workbook';
      bytes: number;
      /** @enum {string} */
      state: 'waiting' | 'running' | 'done' | 'cancelled' | 'failed';
      /** @description Bytes imported so far */
      bytesDone: number;
      importId: number | null;
      /** @description Why it failed, with the cure */
      fault: string | null;
      createdAt: string;
      endedAt: string | null;
      /** @description Who sent it */
      by: string;
      /** @description The same file was imported before */
      sameAs: components['schemas']['SameImport'] | null;
      mapping: components['schemas']['Mapping'] | null;
    };
    ProposedColumn: {
      index: number;
      name: string;
      samples: string[];
      sensor: string | null;
      unit: string | null;
      note: string | null;
    };
    Choice: {
      value: string;
      text: string;
    };
    Question: {
      /** @enum {string} */
      id: 'repeated-hour' | 'missing-hour' | 'day-or-month-first' | 'unit' | 'rows-off-the-step';
      text: string;
      choices: components['schemas']['Choice'][];
      examples: string[];
    };
    Proposal: {
      mapping: components['schemas']['Mapping'];
      /** @enum {string} */
      from: 'sample' | 'last file';
      /** @description All columns, by name */
      columnNames: string[];
      /** @description All but those of the time */
      columns: components['schemas']['ProposedColumn'][];
      /** @description Long tables: the sensors as the file writes them */
      written: string[];
      sheets: string[] | null;
      notes: string[];
      questions: components['schemas']['Question'][];
      sampleLines: string[];
    };
    MappingBody: {
      mapping: components['schemas']['Mapping'];
    };
    PreviewValue: {
      sensor: string;
      value: number;
      unit: string;
    };
    PreviewRow: {
      rowNo: number;
      /** @description END of its interval */
      time: string;
      values: components['schemas']['PreviewValue'][];
    };
    PreviewRefusal: {
      row: number;
      column: string | null;
      code: string;
      text: string;
      raw: string;
    };
    PreviewSpan: {
      sensor: string;
      from: string;
      to: string;
      count: number;
      lowest: number;
      highest: number;
      unit: string;
    };
    Preview: {
      /** @description The first 30 */
      rows: components['schemas']['PreviewRow'][];
      /** @description Readings */
      read: number;
      refused: number;
      /** @description The first 100 */
      refusedRows: components['schemas']['PreviewRefusal'][];
      ignoredColumns: string[];
      spans: components['schemas']['PreviewSpan'][];
      questions: components['schemas']['Question'][];
      /** @description What looks wrong beside the tower's own readings */
      warnings: string[];
      /** @description Whether the whole file was looked at, not only its beginning */
      whole: boolean;
    };
    ForecastOutcome: {
      lowC: number | null;
      windMPerS: number | null;
      highC: number | null;
      /** @description By the parcel method from the morning and the high */
      mixingAtLeastM: number | null;
      /** @description null: open, above the tower */
      mixingAtMostM: number | null;
      towerName: string;
      /** @description Hours of the night that were measured */
      hours: number;
    };
    Forecast: {
      id: number;
      districtId: number;
      day: string;
      lowC: number | null;
      cloudPercent: number | null;
      windMPerS: number | null;
      highC: number | null;
      mixingHeightM: number | null;
      note: string;
      /** @enum {string} */
      origin: 'entered' | 'uploaded' | 'demo';
      enteredAt: string;
      by: string | null;
      /** @description How often it was entered; the newest counts, the others are kept */
      entries: number;
      outcome: components['schemas']['ForecastOutcome'] | null;
    };
    Skill: {
      /** @description Forecasts with an outcome */
      n: number;
      /** @description Mean of forecast minus outcome; null: too few */
      meanError: number | null;
      /** @description Mean of its size; null: too few */
      meanAbsoluteError: number | null;
    };
    ForecastSkill: {
      lowC: components['schemas']['Skill'];
      highC: components['schemas']['Skill'];
      windMPerS: components['schemas']['Skill'];
      /** @description Fewer than this are too few to say */
      least: number;
    };
    ForecastInput: {
      districtId: number;
      /** @description The day whose evening it begins with, as 2026-01-31 */
      day: string;
      /** @description Lowest temperature of the night, noon to noon, °C */
      lowC?: number;
      /** @description Cloud of the night, % of the sky */
      cloudPercent?: number;
      /** @description Mean wind of the night, m/s */
      windMPerS?: number;
      /** @description Highest temperature of the day after, °C */
      highC?: number;
      /** @description Mixing height of the day after, m above ground */
      mixingHeightM?: number;
      note?: string;
    };
    ForecastTableInput: {
      /** @description Comma-separated with a header: district (its name or address part), day, and any of low_c, cloud_percent, wind_m_per_s, high_c, mixing_height_m, note */
      text: string;
    };
    RefusedForecast: {
      row: number;
      /** @description Names the row, the column and the cure */
      text: string;
    };
    ForecastTableResult: {
      taken: number;
      /** @description The same as what counts already; not entered again */
      repeated: number;
      refused: components['schemas']['RefusedForecast'][];
    };
    LabelDto: {
      en: string;
      es: string;
    };
    Measure: {
      name: string;
      /** @enum {string} */
      kind: 'number' | 'yes-no';
      unit: string;
      label: components['schemas']['LabelDto'];
      docs: string;
      /** @description Comparisons that make sense for it */
      ops: string[];
      /** @description The smallest limit a rule may set */
      least: number;
      /** @description The largest limit a rule may set */
      most: number;
    };
    RuleInWords: {
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      begin: string[];
      end: string[];
    };
    RuleRow: {
      id: number;
      districtId: number;
      version: number;
      /** @enum {string} */
      state: 'draft' | 'in force' | 'past';
      note: string;
      body: {
        [key: string]: unknown;
      };
      inWords: components['schemas']['RuleInWords'][];
      sha256: string;
      /** Format: date-time */
      createdAt: string;
      /** Format: date-time */
      fromAt?: string;
      /** Format: date-time */
      toAt?: string;
    };
    RuleInput: {
      /** @description advisory, burnBan or both */
      body: {
        [key: string]: unknown;
      };
      /** @description Why this version; for the record */
      note?: string;
    };
    Office: {
      /** @example Pellworth Clean Air Office */
      name: string;
      /**
       * @description Where residents may call; empty when nowhere
       * @example 208 555 0142
       */
      phone: string;
    };
    SubscriberCount: {
      districtId: number;
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      people: number;
      /** @description Confirmed e-mail addresses */
      emails: number;
      /** @description Confirmed telephone numbers */
      texts: number;
    };
    SubscriptionRequest: {
      /** @enum {string} */
      lang: 'en' | 'es';
      districtSlugs: string[];
      kinds: ('advisory' | 'burnBan')[];
      /** @example ada@pellworth.example */
      email?: string;
      /** @example 208 555 0142 */
      phone?: string;
    };
    SubscriptionReceipt: {
      message: string;
    };
    ConfirmRequest: {
      token: string;
    };
    ConfirmedDto: {
      manageToken: string;
    };
    ContactView: {
      /** @enum {string} */
      channel: 'email' | 'sms';
      /** @description Masked */
      address: string;
      confirmed: boolean;
    };
    SubscriptionView: {
      /** @enum {string} */
      lang: 'en' | 'es';
      districtSlugs: string[];
      kinds: ('advisory' | 'burnBan')[];
      contacts: components['schemas']['ContactView'][];
    };
    SubscriptionPatch: {
      /** @enum {string} */
      lang?: 'en' | 'es';
      districtSlugs?: string[];
      kinds?: ('advisory' | 'burnBan')[];
    };
    Trouble: {
      id: number;
      towerId: number;
      towerName: string;
      /** @enum {string} */
      kind: 'late' | 'silent' | 'clock ahead' | 'clock shifted' | 'source failing';
      /** @description What is wrong and what to look at, in sentences */
      text: string;
      /**
       * Format: date-time
       * @description Since when, as far as the data tell
       */
      since: string;
      /**
       * Format: date-time
       * @description When the service saw it
       */
      seenAt: string;
      /**
       * Format: date-time
       * @description When mail about it was queued for the analysts
       */
      toldAt: string | null;
      /** @description Analysts whose mail server took the mail */
      mailsAccepted: number;
      /** @description Analysts to whom mail still waits or could not be given */
      mailsNotAccepted: number;
      /** Format: date-time */
      endedAt: string | null;
    };
    NoticeBrief: {
      id: number;
      /** @example MF-26-017 */
      ref: string;
      districtId: number;
      districtName: string;
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** @enum {string} */
      state: 'in force' | 'ended' | 'replaced';
      /** Format: date-time */
      issuedAt: string;
      /** @description Name of the officer */
      issuedBy: string;
      /** Format: date-time */
      effectiveAt: string;
      /**
       * Format: date-time
       * @description Written end
       */
      expiresAt: string;
      /** Format: date-time */
      endedAt?: string;
      /** @description Who ended it; absent when it came to its written end */
      endedBy?: string;
      endReason?: string;
      version: number;
    };
    NoticePage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['NoticeBrief'][];
    };
    NoticeDraft: {
      districtId: number;
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** Format: date-time */
      expiresAt: string;
      /** @description Why it is issued without a proposal; kept, not sent */
      reason: string;
    };
    StoveText: {
      /** @enum {string} */
      kind: 'uncertified' | 'certified' | 'pellet' | 'fireplace' | 'open burning';
      /** @example certified stove */
      name: string;
      text: string;
    };
    PublicText: {
      headline: string;
      untilText: string;
      whatToDo: string[];
      stoves: components['schemas']['StoveText'][];
      why: string;
      exemptions: string;
      cautions: string[];
    };
    NoticeText: {
      subject: string;
      mailText: string;
      mailHtml: string;
      /** @description GSM 7-bit characters only */
      sms: string;
      public: components['schemas']['PublicText'];
    };
    NoticeTexts: {
      en: components['schemas']['NoticeText'];
      es: components['schemas']['NoticeText'];
    };
    RecipientCount: {
      people: number;
      emails: number;
      texts: number;
    };
    SegmentCount: {
      en: number;
      es: number;
    };
    NoticePreview: {
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** @enum {string} */
      act: 'begin' | 'end';
      districtId: number;
      ref: string;
      /** Format: date-time */
      expiresAt: string;
      hash: string;
      texts: components['schemas']['NoticeTexts'];
      recipients: components['schemas']['RecipientCount'];
      segments: components['schemas']['SegmentCount'];
      /** @description Whether issuing or ending asks for the password again */
      needsPassword: boolean;
    };
    NoticeByHand: {
      districtId: number;
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** Format: date-time */
      expiresAt: string;
      /** @description Why it is issued without a proposal; kept, not sent */
      reason: string;
      previewHash: string;
      password?: string;
      requestKey: string;
    };
    HeldFacts: {
      neededMinutes: number;
      toleratedMinutes: number;
      recordMinutes: number;
      trueMinutes: number;
      falseMinutes: number;
      notKnownMinutes: number;
      /** @description Minutes it has been true without a break, where longer than asked */
      unbrokenMinutes?: number;
      /** @description It was true since the record begins, perhaps for longer */
      unbrokenOrMore?: boolean;
      /** @enum {string} */
      recordStartsAfter?: 'change of tower' | 'start of record' | 'nothing on record';
    };
    EvaluatedNode: {
      /** @enum {string} */
      kind: 'clause' | 'all' | 'any' | 'not';
      /**
       * @description What counts, held-for included
       * @enum {string}
       */
      truth: 'true' | 'false' | 'not known';
      /**
       * @description What holds at this block
       * @enum {string}
       */
      now: 'true' | 'false' | 'not known';
      /** @description The condition and what was found, in one sentence */
      sentence: string;
      held?: components['schemas']['HeldFacts'];
      /** @enum {string} */
      measure?:
        | 'inversionStrengthC'
        | 'strengthWithinTowerC'
        | 'gradientCPer100m'
        | 'depthM'
        | 'inversionSure'
        | 'episodeMinutes'
        | 'stableDepthM'
        | 'elevatedLid'
        | 'elevatedLidBaseM'
        | 'elevatedLidStrengthC'
        | 'floorToBenchC'
        | 'deltaTClass'
        | 'heatDeficitMJPerM2'
        | 'mixingHeightM'
        | 'ventilationIndexM2PerS'
        | 'surfaceTemperatureC'
        | 'relativeHumidityPct'
        | 'windSpeedMPerS'
        | 'pm25Hour'
        | 'pm25NowCast'
        | 'pm25Day'
        | 'pm25Running24h'
        | 'forecastLowC'
        | 'forecastHighC'
        | 'forecastWindMPerS'
        | 'forecastMixingHeightM'
        | 'hourOfDay'
        | 'month';
      /** @enum {string} */
      op?: '>=' | '>' | '<=' | '<' | '=';
      value?: number | boolean;
      measured?: components['schemas']['RangeValue'];
      parts?: components['schemas']['EvaluatedNode'][];
    };
    EvidenceSentences: {
      en: string[];
      es: string[];
    };
    Evidence: {
      tree: components['schemas']['EvaluatedNode'];
      sentences: components['schemas']['EvidenceSentences'];
      /** @description SHA-256 of the evidence as it is kept */
      sha256: string;
    };
    NoticeEvent: {
      seq: number;
      /** @enum {string} */
      kind: 'issued' | 'ended' | 'expired' | 'replaced';
      /** Format: date-time */
      at: string;
      /** @description A name, or "the service" */
      by: string;
      text: string;
    };
    DeliveryCount: {
      /** @enum {string} */
      channel: 'email' | 'sms';
      /** @enum {string} */
      state: 'queued' | 'sending' | 'accepted' | 'delivered' | 'failed' | 'suppressed' | 'expired';
      count: number;
    };
    NoticeDetail: {
      id: number;
      /** @example MF-26-017 */
      ref: string;
      districtId: number;
      districtName: string;
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** @enum {string} */
      state: 'in force' | 'ended' | 'replaced';
      /** Format: date-time */
      issuedAt: string;
      /** @description Name of the officer */
      issuedBy: string;
      /** Format: date-time */
      effectiveAt: string;
      /**
       * Format: date-time
       * @description Written end
       */
      expiresAt: string;
      /** Format: date-time */
      endedAt?: string;
      /** @description Who ended it; absent when it came to its written end */
      endedBy?: string;
      endReason?: string;
      version: number;
      /** @enum {string} */
      origin: 'proposal' | 'by hand';
      reason: string;
      texts: components['schemas']['NoticeTexts'];
      evidence?: components['schemas']['Evidence'];
      events: components['schemas']['NoticeEvent'][];
      delivery: components['schemas']['DeliveryCount'][];
    };
    Delivery: {
      id: number;
      /** @enum {string} */
      channel: 'email' | 'sms';
      /** @description Masked */
      to: string;
      /** @enum {string} */
      state: 'queued' | 'sending' | 'accepted' | 'delivered' | 'failed' | 'suppressed' | 'expired';
      attempts: number;
      /** Format: date-time */
      lastAt: string | null;
      detail: string | null;
    };
    DeliveryPage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['Delivery'][];
    };
    NoticeEnding: {
      previewHash: string;
      /** @description Again, for a burn ban */
      password?: string;
      /** @description Chosen by the client, the same for repeats of one click */
      requestKey: string;
      version: number;
      reason: string;
    };
    ProposalCard: {
      id: number;
      districtId: number;
      districtName: string;
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** @enum {string} */
      act: 'begin' | 'end';
      /** @enum {string} */
      state: 'open' | 'confirmed' | 'declined' | 'returned' | 'issued' | 'lapsed';
      /** Format: date-time */
      openedAt: string;
      /**
       * Format: date-time
       * @description End of the block that was judged
       */
      tEnd: string;
      /** @description What decided, in one line */
      summary: string;
      confirmedBy?: string;
      /** Format: date-time */
      confirmedAt?: string;
      /** @description The analyst's sentence for the officer */
      note?: string;
      /** @description Why it was declined or returned, or why it lapsed */
      reason?: string;
      closedBy?: string;
      /** Format: date-time */
      closedAt?: string;
      noticeId?: number;
      version: number;
    };
    ProposalPage: {
      total: number;
      page: number;
      pageSize: number;
      items: components['schemas']['ProposalCard'][];
    };
    ProposalRule: {
      id: number;
      version: number;
    };
    HistoryEntry: {
      /** Format: date-time */
      at: string;
      by: string;
      act: string;
      text: string;
    };
    ProposalDetail: {
      id: number;
      districtId: number;
      districtName: string;
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** @enum {string} */
      act: 'begin' | 'end';
      /** @enum {string} */
      state: 'open' | 'confirmed' | 'declined' | 'returned' | 'issued' | 'lapsed';
      /** Format: date-time */
      openedAt: string;
      /**
       * Format: date-time
       * @description End of the block that was judged
       */
      tEnd: string;
      /** @description What decided, in one line */
      summary: string;
      confirmedBy?: string;
      /** Format: date-time */
      confirmedAt?: string;
      /** @description The analyst's sentence for the officer */
      note?: string;
      /** @description Why it was declined or returned, or why it lapsed */
      reason?: string;
      closedBy?: string;
      /** Format: date-time */
      closedAt?: string;
      noticeId?: number;
      version: number;
      rule: components['schemas']['ProposalRule'];
      evidence: components['schemas']['Evidence'];
      profile: components['schemas']['Profile'] | null;
      history: components['schemas']['HistoryEntry'][];
      /**
       * Format: date-time
       * @description The written end proposed for the notice
       */
      suggestedExpiresAt: string;
    };
    ConfirmProposal: {
      /** @description The version that was read */
      version: number;
      note?: string;
    };
    RefuseProposal: {
      /** @description The version that was read */
      version: number;
      reason: string;
    };
    PreviewProposal: {
      /**
       * Format: date-time
       * @description The rule's longest validity when left out
       */
      expiresAt?: string;
    };
    IssueProposal: {
      /** @description The version that was read */
      version: number;
      /** @description Hash of the preview that was read */
      previewHash: string;
      /** Format: date-time */
      expiresAt?: string;
      /** @description Asked again for a burn ban */
      password?: string;
      /** @description Made by the client; the same key issues once however often it is sent */
      requestKey: string;
    };
    SpeakerDto: {
      towerId: number;
      name: string;
    };
    AirFinding: {
      /** @enum {string} */
      surface: 'present' | 'absent' | 'not known';
      strengthC: components['schemas']['RangeValue'];
      /**
       * @description Whether it is beyond what the sensors could mistake
       * @enum {string}
       */
      sure: 'true' | 'false' | 'not known';
      /** @description How long the episode has lasted */
      forMinutes: components['schemas']['RangeValue'];
      /** @description Height of its top above ground; the lowest it can be where it is open */
      topM?: number;
      /** @enum {string} */
      open: 'no' | 'at the top' | 'cut by a missing level';
    };
    DistrictAir: {
      districtId: number;
      slug: string;
      name: string;
      timeZone: string;
      /** Format: date-time */
      tEnd: string | null;
      /** @description Whether the newest block is recent enough to speak for now */
      fresh: boolean;
      /** @description Why nothing is known of now */
      reason?: string;
      speaker: components['schemas']['SpeakerDto'] | null;
      /** @description Towers that gave nothing for this block */
      silent: string[];
      finding: components['schemas']['AirFinding'];
      /** @enum {string} */
      elevatedLid: 'true' | 'false' | 'not known';
      pm25Hour: components['schemas']['RangeValue'];
      pm25NowCast: components['schemas']['RangeValue'];
      pm25Running24h: components['schemas']['RangeValue'];
      floorToBenchC: components['schemas']['RangeValue'];
      heatDeficitMJPerM2: components['schemas']['RangeValue'];
      breakUpTemperatureC: components['schemas']['RangeValue'];
      mixingHeightM: components['schemas']['RangeValue'];
      forecastLowC: components['schemas']['RangeValue'];
      forecastWindMPerS: components['schemas']['RangeValue'];
      windSpeedMPerS: components['schemas']['RangeValue'];
      surfaceTemperatureC: components['schemas']['RangeValue'];
      levels: components['schemas']['ProfileLevel'][];
      inForce: components['schemas']['NoticeBrief'][];
    };
    TowerFreshness: {
      id: number;
      name: string;
      /** Format: date-time */
      newest: string | null;
      late: boolean;
    };
    Desk: {
      /** Format: date-time */
      at: string;
      districts: components['schemas']['DistrictAir'][];
      proposals: components['schemas']['ProposalCard'][];
      towers: components['schemas']['TowerFreshness'][];
    };
    HistoryPoint: {
      /** Format: date-time */
      t: string;
      strength: components['schemas']['RangeValue'];
      /** @description Strength within the tower, °C */
      within: number | null;
      /** @enum {string} */
      sure: 'true' | 'false' | 'not known';
      speakerId: number | null;
      reason?: string;
      /** @description Where a point stands for the strongest block of a step: the least within the tower, °C */
      lowest?: number | null;
      /**
       * Format: date-time
       * @description When the strongest block of the step ended
       */
      strongestAt?: string;
    };
    HistoryLimit: {
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** @enum {string} */
      act: 'begin' | 'end';
      measure: string;
      op: string;
      value: number;
      heldMinutes: number;
    };
    NightSpan: {
      /** Format: date-time */
      from: string;
      /** Format: date-time */
      to: string;
    };
    DistrictHistory: {
      districtId: number;
      timeZone: string;
      /** Format: date-time */
      from: string;
      /** Format: date-time */
      to: string;
      /** @description Minutes a point stands for; more than a block where every block would be too many */
      stepMinutes: number;
      points: components['schemas']['HistoryPoint'][];
      limits: components['schemas']['HistoryLimit'][];
      notices: components['schemas']['NoticeBrief'][];
      nights: components['schemas']['NightSpan'][];
    };
    PublicNotice: {
      ref: string;
      /** @enum {string} */
      kind: 'advisory' | 'burnBan';
      /** Format: date-time */
      until: string;
      /** Format: date-time */
      issuedAt: string;
    };
    PublicTexts: {
      en: components['schemas']['PublicText'];
      es: components['schemas']['PublicText'];
    };
    PublicSmoke: {
      pm25: components['schemas']['RangeValue'];
      /** Format: date-time */
      at: string;
    };
    PublicLevel: {
      heightM: number;
      temperatureC: number | null;
    };
    PublicInversion: {
      /** @enum {string} */
      surface: 'present' | 'absent' | 'not known';
      topM: number | null;
      /** @enum {string} */
      open: 'no' | 'at the top' | 'cut by a missing level';
    };
    PublicStatus: {
      slug: string;
      name: string;
      timeZone: string;
      /** @enum {string} */
      state: 'no restriction' | 'advisory' | 'burn ban' | 'not known';
      notice?: components['schemas']['PublicNotice'];
      texts: components['schemas']['PublicTexts'];
      smoke?: components['schemas']['PublicSmoke'];
      levels?: components['schemas']['PublicLevel'][];
      inversion?: components['schemas']['PublicInversion'];
      /**
       * Format: date-time
       * @description End of the newest block
       */
      at: string | null;
      /**
       * Format: date-time
       * @description When the service last looked
       */
      checkedAt: string;
      contactPhone: string;
      ordinanceRef: string;
      officeName: string;
    };
  };
  responses: never;
  parameters: never;
  requestBodies: never;
  headers: never;
  pathItems: never;
}
export type $defs = Record<string, never>;
export interface operations {
  'Activity.page': {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        districtId?: number;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ActivityPage'];
        };
      };
    };
  };
  'Auth.signIn': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SignIn'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Me'];
        };
      };
    };
  };
  'Auth.signOut': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
    };
  };
  'Auth.me': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Me'];
        };
      };
    };
  };
  'Auth.link': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        token: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['LinkView'];
        };
      };
    };
  };
  'Auth.firstAdministrator': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['FirstAdministrator'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Me'];
        };
      };
    };
  };
  'Auth.accept': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['AcceptInvitation'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Me'];
        };
      };
    };
  };
  'Users.list': {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['UserPage'];
        };
      };
    };
  };
  'Users.invite': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['InviteUser'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['InvitedUser'];
        };
      };
    };
  };
  'Users.change': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ChangeUser'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['UserView'];
        };
      };
    };
  };
  'Users.retire': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['UserView'];
        };
      };
    };
  };
  'Users.passwordLink': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['PasswordLink'];
        };
      };
    };
  };
  'Reworks.list': {
    parameters: {
      query?: {
        towerId?: number;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Rework'][];
        };
      };
    };
  };
  'Towers.list': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Tower'][];
        };
      };
    };
  };
  'Towers.create': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['TowerInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Tower'];
        };
      };
    };
  };
  'Towers.get': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Tower'];
        };
      };
    };
  };
  'Towers.removeTower': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
    };
  };
  'Towers.change': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['TowerPatch'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Tower'];
        };
      };
    };
  };
  'Towers.addSensor': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SensorInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Sensor'];
        };
      };
    };
  };
  'Towers.removeSensor': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
    };
  };
  'Towers.changeSensor': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SensorPatch'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Sensor'];
        };
      };
    };
  };
  'Towers.removeVersion': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
        from: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Sensor'];
        };
      };
    };
  };
  'Towers.moveVersion': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
        from: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['VersionDateInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Sensor'];
        };
      };
    };
  };
  'Towers.neighbours': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Neighbours'];
        };
      };
    };
  };
  'Towers.setNeighbours': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['Neighbours'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Neighbours'];
        };
      };
    };
  };
  'Towers.changes': {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['TowerChangePage'];
        };
      };
    };
  };
  'Keys.list': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['IngestKey'][];
        };
      };
    };
  };
  'Keys.create': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['KeyInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['KeyMade'];
        };
      };
    };
  };
  'Keys.revoke': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
    };
  };
  'Sources.list': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Source'][];
        };
      };
    };
  };
  'Sources.add': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SourceInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Source'];
        };
      };
    };
  };
  'Sources.change': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SourcePatch'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Source'];
        };
      };
    };
  };
  'Sources.retire': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Source'];
        };
      };
    };
  };
  'Districts.list': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['District'][];
        };
      };
    };
  };
  'Districts.create': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['DistrictInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['District'];
        };
      };
    };
  };
  'Districts.get': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['District'];
        };
      };
    };
  };
  'Districts.change': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['DistrictPatch'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['District'];
        };
      };
    };
  };
  'Collect.collect': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Source'];
        };
      };
    };
  };
  'Ingest.readings': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['IngestResult'];
        };
      };
      /** @description The key has sent too much; Retry-After says when to send again */
      429: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
    };
  };
  'Imports.list': {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        towerId?: number;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ImportPage'];
        };
      };
    };
  };
  'Imports.get': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Import'];
        };
      };
    };
  };
  'Imports.refused': {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['RefusedRowPage'];
        };
      };
    };
  };
  'Imports.download': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'text/csv': string;
        };
      };
    };
  };
  'Imports.withdraw': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['WithdrawInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Import'];
        };
      };
    };
  };
  'Profiles.latest': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Profile'];
        };
      };
    };
  };
  'Profiles.range': {
    parameters: {
      query?: {
        from?: string;
        to?: string;
        limit?: number;
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProfileSpan'];
        };
      };
    };
  };
  'Profiles.state': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['PipelineState'];
        };
      };
    };
  };
  'Overrides.list': {
    parameters: {
      query: {
        towerId: number;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Override'][];
        };
      };
    };
  };
  'Overrides.set': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['OverrideInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Override'];
        };
      };
    };
  };
  'Overrides.undo': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Override'];
        };
      };
    };
  };
  'Screening.calendar': {
    parameters: {
      query: {
        from: string;
        to: string;
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['TowerCalendar'];
        };
      };
    };
  };
  'Screening.flagged': {
    parameters: {
      query: {
        page?: number;
        pageSize?: number;
        from: string;
        to: string;
        sensorId?: number;
        check?:
          | 'range'
          | 'spike'
          | 'step'
          | 'persistence'
          | 'internal consistency'
          | 'vertical consistency'
          | 'neighbours'
          | 'override'
          | 'stuck'
          | 'clock';
        /** @description The worst of the span; any when left out */
        quality?: 'suspect' | 'failed';
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['FlaggedSpanPage'];
        };
      };
    };
  };
  'Screening.readings': {
    parameters: {
      query: {
        from: string;
        to: string;
        sensorId?: number;
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['RawReadings'];
        };
      };
    };
  };
  'Screening.reading': {
    parameters: {
      query: {
        sensorId: number;
        /** @description End of its interval */
        t: string;
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ReadingDetail'];
        };
      };
    };
  };
  'Limits.list': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SensorLimits'][];
        };
      };
    };
  };
  'Limits.set': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['LimitsInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SensorLimits'];
        };
      };
    };
  };
  'Uploads.list': {
    parameters: {
      query?: {
        towerId?: number;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Upload'][];
        };
      };
    };
  };
  'Uploads.receive': {
    parameters: {
      query: {
        towerId: number;
        /** @description The file's name */
        name: string;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/octet-stream': string;
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Upload'];
        };
      };
    };
  };
  'Uploads.get': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Upload'];
        };
      };
    };
  };
  'Uploads.remove': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
    };
  };
  'Uploads.proposal': {
    parameters: {
      query?: {
        sheet?: string;
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Proposal'];
        };
      };
    };
  };
  'Uploads.preview': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['MappingBody'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Preview'];
        };
      };
    };
  };
  'Uploads.commit': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['MappingBody'];
      };
    };
    responses: {
      202: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Upload'];
        };
      };
    };
  };
  'Uploads.cancel': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Upload'];
        };
      };
    };
  };
  'Forecasts.list': {
    parameters: {
      query: {
        districtId: number;
        from: string;
        to: string;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Forecast'][];
        };
      };
    };
  };
  'Forecasts.enter': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ForecastInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Forecast'];
        };
      };
    };
  };
  'Forecasts.skill': {
    parameters: {
      query: {
        districtId: number;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ForecastSkill'];
        };
      };
    };
  };
  'Forecasts.table': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ForecastTableInput'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ForecastTableResult'];
        };
      };
    };
  };
  'Rules.measures': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Measure'][];
        };
      };
    };
  };
  'Rules.list': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['RuleRow'][];
        };
      };
    };
  };
  'Rules.draft': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['RuleInput'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['RuleRow'];
        };
      };
    };
  };
  'Rules.putInForce': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['RuleRow'];
        };
      };
    };
  };
  'Office.get': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Office'];
        };
      };
    };
  };
  'Office.set': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['Office'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Office'];
        };
      };
    };
  };
  'Subscribers.list': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SubscriberCount'][];
        };
      };
    };
  };
  'Subscriptions.subscribe': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SubscriptionRequest'];
      };
    };
    responses: {
      202: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SubscriptionReceipt'];
        };
      };
    };
  };
  'Subscriptions.confirm': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ConfirmRequest'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ConfirmedDto'];
        };
      };
    };
  };
  'Subscriptions.view': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        token: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SubscriptionView'];
        };
      };
    };
  };
  'Subscriptions.change': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        token: string;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['SubscriptionPatch'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['SubscriptionView'];
        };
      };
    };
  };
  'Subscriptions.leave': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        token: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      204: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
    };
  };
  'Troubles.list': {
    parameters: {
      query?: {
        /** @description true: only what is not over */
        open?: boolean;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Trouble'][];
        };
      };
    };
  };
  'Notices.page': {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        districtId?: number;
        kind?: 'advisory' | 'burnBan';
        state?: 'in force' | 'ended' | 'replaced';
        /** @description Issued at or after */
        from?: string;
        /** @description Issued before */
        to?: string;
        /** @description Words in reference, reason or texts */
        q?: string;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['NoticePage'];
        };
      };
    };
  };
  'Notices.issue': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['NoticeByHand'];
      };
    };
    responses: {
      201: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['NoticeDetail'];
        };
      };
    };
  };
  'Notices.preview': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['NoticeDraft'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['NoticePreview'];
        };
      };
    };
  };
  'Notices.detail': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['NoticeDetail'];
        };
      };
    };
  };
  'Notices.deliveries': {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        state?: 'queued' | 'sending' | 'accepted' | 'delivered' | 'failed' | 'suppressed' | 'expired';
        channel?: 'email' | 'sms';
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['DeliveryPage'];
        };
      };
    };
  };
  'Notices.previewEnd': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['NoticePreview'];
        };
      };
    };
  };
  'Notices.end': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['NoticeEnding'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['NoticeDetail'];
        };
      };
    };
  };
  'Proposals.page': {
    parameters: {
      query?: {
        page?: number;
        pageSize?: number;
        /** @description waiting: open, confirmed or returned */
        state?: 'open' | 'confirmed' | 'declined' | 'returned' | 'issued' | 'lapsed' | 'waiting';
        districtId?: number;
      };
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProposalPage'];
        };
      };
    };
  };
  'Proposals.detail': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProposalDetail'];
        };
      };
    };
  };
  'Proposals.confirm': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['ConfirmProposal'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProposalDetail'];
        };
      };
    };
  };
  'Proposals.decline': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['RefuseProposal'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProposalDetail'];
        };
      };
    };
  };
  'Proposals.return': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['RefuseProposal'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['ProposalDetail'];
        };
      };
    };
  };
  'Proposals.preview': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['PreviewProposal'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['NoticePreview'];
        };
      };
    };
  };
  'Proposals.issue': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody: {
      content: {
        'application/json': components['schemas']['IssueProposal'];
      };
    };
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['NoticeDetail'];
        };
      };
    };
  };
  'Desk.now': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['Desk'];
        };
      };
    };
  };
  'Desk.past': {
    parameters: {
      query: {
        from: string;
        to: string;
      };
      header?: never;
      path: {
        id: number;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['DistrictHistory'];
        };
      };
    };
  };
  'PublicStatus.list': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['PublicStatus'][];
        };
      };
    };
  };
  'PublicStatus.get': {
    parameters: {
      query?: never;
      header?: never;
      path: {
        slug: string;
      };
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': components['schemas']['PublicStatus'];
        };
      };
    };
  };
  'Health.live': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      200: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
      };
    };
  };
  'Health.ready': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    requestBody?: never;
    responses: {
      /** @description The Health Check is successful */
      200: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': {
            /** @example ok */
            status?: string;
            /**
             * @example {
             *       "database": {
             *         "status": "up"
             *       }
             *     }
             */
            info?: {
              [key: string]: {
                status: string;
              } & {
                [key: string]: unknown;
              };
            } | null;
            /** @example {} */
            error?: {
              [key: string]: {
                status: string;
              } & {
                [key: string]: unknown;
              };
            } | null;
            /**
             * @example {
             *       "database": {
             *         "status": "up"
             *       }
             *     }
             */
            details?: {
              [key: string]: {
                status: string;
              } & {
                [key: string]: unknown;
              };
            };
          };
        };
      };
      /** @description The Health Check is not successful */
      503: {
        headers: {
          [name: string]: unknown;
        };
        content: {
          'application/json': {
            /** @example error */
            status?: string;
            /**
             * @example {
             *       "database": {
             *         "status": "up"
             *       }
             *     }
             */
            info?: {
              [key: string]: {
                status: string;
              } & {
                [key: string]: unknown;
              };
            } | null;
            /**
             * @example {
             *       "redis": {
             *         "status": "down",
             *         "message": "Could not connect"
             *       }
             *     }
             */
            error?: {
              [key: string]: {
                status: string;
              } & {
                [key: string]: unknown;
              };
            } | null;
            /**
             * @example {
             *       "database": {
             *         "status": "up"
             *       },
             *       "redis": {
             *         "status": "down",
             *         "message": "Could not connect"
             *       }
             *     }
             */
            details?: {
              [key: string]: {
                status: string;
              } & {
                [key: string]: unknown;
              };
            };
          };
        };
      };
    };
  };
}
