import { z } from 'zod';

/** For calls whose answer says nothing more than that it was done. */
export const nothing = z.unknown();
