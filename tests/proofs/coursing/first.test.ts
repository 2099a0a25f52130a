import { expect, it } from 'vitest';
import { proveCoursing } from '../../helpers/proveCoursing';

it('courses the first 250 of 1 000 random problems at the least cost that HiGHS finds, part by part', async () => {
  const { equal, infeasible, thinned, uneven } = await proveCoursing(250, 1);
  expect(equal).toBe(250);
  // Problems of every kind were among them.
  expect(Math.min(infeasible, thinned, uneven)).toBeGreaterThan(50);
}, 120_000);
