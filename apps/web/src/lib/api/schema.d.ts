/** Written by `npm run openapi` from the API's description; change the API, not this file. */
export interface paths {
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
    delete?: never;
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
    delete?: never;
    options?: never;
    head?: never;
    patch: operations['Towers.changeSensor'];
    trace?: never;
  };
  '/api/towers/{id}/sources': {
    parameters: {
      query?: never;
      header?: never;
      path?: never;
      cookie?: never;
    };
    get: operations['Towers.listSources'];
    put?: never;
    post: operations['Towers.addSource'];
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
    SignIn: {
      /** Format: email */
      email: string;
      /** Format: password */
      password: string;
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
    InviteUser: {
      /** Format: email */
      email: string;
      name: string;
      /** @enum {string} */
      role: 'administrator' | 'analyst' | 'officer';
      districtIds?: number[];
    };
    ChangeUser: {
      name?: string;
      /** @enum {string} */
      role?: 'administrator' | 'analyst' | 'officer';
      districtIds?: number[];
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
      /** @default time */
      timeColumn: string;
      /**
       * @default iso
       * @enum {string}
       */
      timeForm: 'iso' | 'day/month/year' | 'month/day/year' | 'epoch-seconds';
      /** @description Marks for "no reading"; the empty cell always is one */
      missing?: string[];
      /** @description Header → sensor name, where they differ */
      columns?: Record<string, never>;
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
    };
    SourceInput: {
      /** @enum {string} */
      kind: 'folder' | 'push';
      /** @description A file or folder beneath the loggers' folder */
      path?: string;
      mapping?: components['schemas']['Mapping'];
      /** @default 60 */
      intervalSeconds: number;
    };
    KeyInput: {
      /** @example mast logger */
      name: string;
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
    RuleInput: {
      /** @description advisory, burnBan or both */
      body: {
        [key: string]: unknown;
      };
      /** @description Why this version; for the record */
      note?: string;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
      };
    };
  };
  'Towers.listSources': {
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
        content?: never;
      };
    };
  };
  'Towers.addSource': {
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
        content?: never;
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
      201: {
        headers: {
          [name: string]: unknown;
        };
        content?: never;
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
