/** What a screen hears when something of its shop changed: the topic alone, no person and no row. */
export const liveTopics = [
  'visits',
  'readings',
  'messages',
  'releases',
  'jobs',
  'crews',
  'site',
] as const;
export type LiveTopic = (typeof liveTopics)[number];

/** The name of the event in the stream (WHATWG HTML, 9.2, server-sent events). */
export const liveEvent = 'changed';

export function isLiveTopic(text: string): text is LiveTopic {
  return (liveTopics as readonly string[]).includes(text);
}
