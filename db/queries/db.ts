/** What every query takes first, named here for those who call queries and know nothing else of the database. */
export type { Db } from '../connect';
