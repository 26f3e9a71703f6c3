import sequelizeStore from 'connect-session-sequelize';
import session from 'express-session';
import type { Sequelize } from 'sequelize';
import type { Settings } from '../../config/settings';
import type { SessionFacts } from './session-data';

const SequelizeStore = sequelizeStore(session.Store);

/**
 * Sessions in the database. The store's own touching and clearing are off: the session itself changes at most once a
 * minute, and a job under the injected clock clears. A row's ends follow from what the session keeps.
 */
export function sessionStore(db: Sequelize, settings: Settings): session.Store {
  class Store extends SequelizeStore {
    /** Asked by the store at every save: when the session ends unless there is another request. */
    expiration({ seenAt = 0 }: SessionFacts): Date {
      return new Date((seenAt + settings.sessionIdleMinutes * 60) * 1000);
    }
  }
  const options = {
    db,
    table: 'Session',
    disableTouch: true,
    checkExpirationInterval: 0,
    extendDefaultFields: (defaults: { data: string; expires: Date }, facts: SessionFacts) => ({
      ...defaults,
      absoluteEnd: (facts.signedInAt ?? 0) + settings.sessionMaxHours * 3600,
      userId: facts.passport?.user?.id ?? null,
    }),
  };
  return new Store(options);
}
