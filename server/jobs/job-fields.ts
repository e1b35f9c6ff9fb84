import { sql } from 'drizzle-orm';
import { customers, jobs, sites } from '@/db/schema';

/** What a row of the list shows, from the job joined with its customer and site. */
export const jobRowFields = {
  id: jobs.id,
  number: jobs.number,
  title: jobs.title,
  stage: jobs.stage,
  customerName: customers.name,
  phone: customers.phone,
  street: sites.street,
  town: sites.town,
  isOnMap: sql<boolean>`${sites.latitude} is not null`,
  unitCount: jobs.unitCount,
  readyOn: jobs.readyOn,
  createdAt: jobs.createdAt,
};
