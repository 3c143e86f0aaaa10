export { closeDatabase, database, type Database, type Tx } from './connection';
export { asPerson, inFirm } from './in-firm';
