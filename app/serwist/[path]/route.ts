import { createSerwistRoute } from '@serwist/turbopack';
import { workerOptions } from '@/server/base/worker-options';

export const { dynamic, dynamicParams, revalidate, generateStaticParams, GET } = createSerwistRoute(
  workerOptions(),
);
