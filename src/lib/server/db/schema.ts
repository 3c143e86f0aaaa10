/**
 * Every table. Tenant tables lead with `firm_id` in their primary key, so that the database can one day be
 * distributed by it, and carry the policy of the current firm. Tables of sign-in know no firm and stand outside.
 */
export * from './tables/sign-in';
export * from './tables/firms';
export * from './tables/designs';
