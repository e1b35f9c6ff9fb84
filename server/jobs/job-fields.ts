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
  unitCount: jobs.unitCount,
  readyOn: jobs.readyOn,
  createdAt: jobs.createdAt,
};
