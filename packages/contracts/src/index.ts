/** Closed lists that the API and the web share: who may do what, error codes, lifecycles, quality codes. */
export * from './errors/error-codes';
export * from './lifecycles/lifecycle';
export * from './lifecycles/notice-lifecycle';
export * from './lifecycles/outbox-lifecycle';
export * from './lifecycles/proposal-lifecycle';
export * from './lifecycles/user-lifecycle';
export * from './quality/quality-codes';
export * from './roles/permissions';
export * from './roles/roles';
