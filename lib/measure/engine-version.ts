/** Changes whenever the same readings could give another figure; kept with every release. */
export const ENGINE_VERSION = '2';
