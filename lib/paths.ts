/** Every address of the product, in one place: links and requests are made from these and from nothing else. */
import type { SheetFileKind } from '@/lib/contracts/sheet-files';

const part = encodeURIComponent;

/** Addresses of pages. */
export const paths = {
  front: () => '/',
  check: () => '/check',
  /** `next` is where to go after signing in; only an address on this site is followed. */
  signIn: (next?: string) => (next ? `/sign-in?next=${part(next)}` : '/sign-in'),
  signUp: () => '/sign-up',
  join: (invitationId: string) => `/join/${part(invitationId)}`,

  /** How a new shop begins. */
  start: () => '/start',
  diary: () => '/diary',
  /** The diary opened at a civil date, "2026-05-12". */
  diaryOn: (date: string) => `/diary?on=${part(date)}`,
  /** The diary with the times that work for a job. */
  diaryTimes: (jobId: string) => `/diary?times=${part(jobId)}`,
  /** The shop is late: what it moves. */
  slip: () => '/diary/late',
  /** The same, begun with a job that is so many working days late. */
  slipOf: (jobId: string, days: number) => `/diary/late?job=${part(jobId)}&days=${days}`,
  days: () => '/days',
  day: (date: string) => `/days/${part(date)}`,
  jobs: () => '/jobs',
  newJob: () => '/jobs/new',
  importJobs: () => '/jobs/import',
  job: (jobId: string) => `/jobs/${part(jobId)}`,
  room: (jobId: string, roomId: string) => `/jobs/${part(jobId)}/rooms/${part(roomId)}`,
  /** The released sheet, by the letter of its revision. */
  sheet: (jobId: string, roomId: string, revision: string) =>
    `/jobs/${part(jobId)}/rooms/${part(roomId)}/sheets/${part(revision)}`,
  bench: () => '/bench',
  crews: () => '/crews',
  messages: () => '/messages',
  /** What was said with one customer, both ways. */
  thread: (customerId: string) => `/messages/${part(customerId)}`,
  /** The shop's own words for each occasion. */
  wordings: () => '/messages/wording',
  snags: () => '/snags',
  checklists: () => '/rules/checklists',
  numbers: () => '/numbers',
  /** One figure of the last so many days, with the jobs behind it. */
  numbersOf: (figure: string, days: number) => `/numbers?figure=${part(figure)}&days=${days}`,
  rules: () => '/rules',
  programs: () => '/rules/programs',
  /** The measuring tools and how far each may be off. */
  tools: () => '/rules/tools',

  today: () => '/today',
  todayVisit: (visitId: string) => `/today/${part(visitId)}`,
  walls: (roomId: string) => `/walls/${part(roomId)}`,
  /** A room that is yet to be drawn; the phone makes its id. */
  newWalls: (roomId: string, jobId: string) => `/walls/${part(roomId)}?job=${part(jobId)}`,

  /** The customer's page; the token is the whole of the permission. */
  customerVisit: (token: string) => `/v/${part(token)}`,

  /** Where the customer's answer is posted, as a plain form. */
  customerAnswer: (token: string) => `/v/${part(token)}/answer`,
  /** Other times for their visit; where one is held, and where it is taken. */
  customerTimes: (token: string) => `/v/${part(token)}/times`,
  customerHold: (token: string) => `/v/${part(token)}/hold`,
  customerTake: (token: string) => `/v/${part(token)}/take`,
  /** What the customer signed, as a PDF. */
  customerSignOff: (token: string) => `/v/${part(token)}/sign-off`,
  customerCalendar: (token: string) => `/v/${part(token)}/calendar`,

  demo: () => '/demo',
  demoPhone: () => '/demo/phone',
  demoPhoneOf: (to: { number: string } | { address: string }) =>
    'number' in to
      ? `/demo/phone?number=${part(to.number)}`
      : `/demo/phone?address=${part(to.address)}`,
  demoReply: () => '/demo/phone/reply',
} as const;

/** Addresses that answer requests. */
export const apiPaths = {
  signIn: () => '/api/auth/sign-in/email',
  signOut: () => '/api/auth/sign-out',
  switchShop: () => '/api/people/switch-shop',
  shops: () => '/api/shops',
  sampleShop: () => '/api/shops/sample',
  joinShop: () => '/api/people/join',
  people: () => '/api/people',
  invitations: () => '/api/people/invitations',

  views: () => '/api/views',
  viewsOf: (table: string) => `/api/views?table=${part(table)}`,
  view: (viewId: string) => `/api/views/${part(viewId)}`,
  jobs: () => '/api/jobs',
  jobSearch: (search: string) => `/api/jobs?search=${part(search)}`,
  job: (jobId: string) => `/api/jobs/${part(jobId)}`,
  /** The pin of its site on the map. */
  jobPlace: (jobId: string) => `/api/jobs/${part(jobId)}/place`,
  papers: (jobId: string) => `/api/jobs/${part(jobId)}/papers`,
  /** The bench says that the cabinets are ready. */
  jobReady: (jobId: string) => `/api/jobs/${part(jobId)}/ready`,
  /** Everything of one customer, to save. */
  customerExport: (customerId: string) => `/api/customers/${part(customerId)}/export`,
  customerErasure: (customerId: string) => `/api/customers/${part(customerId)}/erasure`,
  rooms: () => '/api/rooms',
  room: (roomId: string) => `/api/rooms/${part(roomId)}`,
  /** What a phone needs to begin a room of this job without a signal. */
  blankBook: (jobId: string, roomId: string) =>
    `/api/rooms/blank?jobId=${part(jobId)}&roomId=${part(roomId)}`,
  readings: () => '/api/readings',
  submitRoom: (roomId: string) => `/api/rooms/${part(roomId)}/submit`,
  runs: (roomId: string) => `/api/rooms/${part(roomId)}/runs`,
  files: () => '/api/files',
  file: (fileId: string) => `/api/files/${part(fileId)}`,
  photosOfRoom: (roomId: string) => `/api/files?roomId=${part(roomId)}`,
  fit: (roomId: string) => `/api/fits?roomId=${part(roomId)}`,
  sheets: () => '/api/sheets',
  takeUpSheet: (releaseId: string) => `/api/sheets/${part(releaseId)}/take-up`,
  /** A released sheet to take away: "sheet.pdf", "cut-list.csv" … */
  sheetFile: (releaseId: string, kind: SheetFileKind) =>
    `/api/sheets/${part(releaseId)}/files/${part(kind)}`,
  bench: () => '/api/bench',

  /** The jobs behind a figure, as CSV. */
  numbersFile: (figure: string, days: number) => `/api/numbers/${part(figure)}?days=${days}`,
  openInterface: () => '/api/openapi.json',
  programKeys: () => '/api/programs/keys',
  programKey: (keyId: string) => `/api/programs/keys/${part(keyId)}`,
  webhooks: () => '/api/programs/webhooks',
  webhook: (webhookId: string) => `/api/programs/webhooks/${part(webhookId)}`,
  visits: () => '/api/visits',
  findVisits: (search: string) => `/api/visits/find?search=${part(search)}`,
  visit: (visitId: string) => `/api/visits/${part(visitId)}`,
  noteYes: (visitId: string) => `/api/visits/${part(visitId)}/yes`,
  callOffVisit: (visitId: string) => `/api/visits/${part(visitId)}/call-off`,
  undoVisitChange: (visitId: string) => `/api/visits/${part(visitId)}/undo`,
  reportVisit: (visitId: string) => `/api/visits/${part(visitId)}/report`,
  /** What a crew tells from site, many taps in one request. */
  dayEvents: () => '/api/days/events',
  /** What a crew needs at one stop. */
  stop: (visitId: string) => `/api/days/stops/${part(visitId)}`,
  accessCode: (visitId: string) => `/api/days/stops/${part(visitId)}/code`,
  forCrew: (jobId: string) => `/api/jobs/${part(jobId)}/for-crew`,
  snags: () => '/api/snags',
  snagsOfJob: (jobId: string) => `/api/snags?jobId=${part(jobId)}`,
  snag: (snagId: string) => `/api/snags/${part(snagId)}`,
  closeSnag: (snagId: string) => `/api/snags/${part(snagId)}/close`,
  answerSnag: (snagId: string) => `/api/snags/${part(snagId)}/answer`,
  /** What the customer signed, as a PDF. */
  signOffCopy: (signOffId: string) => `/api/sign-offs/${part(signOffId)}/copy`,
  today: (date?: string) => (date ? `/api/days/today?date=${part(date)}` : '/api/days/today'),
  openings: () => '/api/openings',
  /** Keeps an opening for fifteen minutes; a held time is taken or let go. */
  holdOpening: () => '/api/openings/hold',
  takeHeldTime: () => '/api/openings/take',
  letGoHeldTime: () => '/api/openings/let-go',
  /** A better order of a day's stops: asked for, and accepted. */
  planDay: () => '/api/days/plan',
  acceptDayPlan: () => '/api/days/plan/accept',
  /** For the map, which puts the numbers in. */
  tiles: () => '/api/tiles/{z}/{x}/{y}',
  /** What real times say about the shop's minutes. */
  durationCorrections: () => '/api/visits/duration-corrections',
  /** The shop is late: what it moves, and all of it accepted at once. */
  slipPreview: () => '/api/slips/preview',
  acceptSlip: () => '/api/slips/accept',
  waiting: () => '/api/waiting',
  crews: () => '/api/crews',
  crew: (crewId: string) => `/api/crews/${part(crewId)}`,
  crewHours: (from: string, to: string) => `/api/crews/hours?from=${part(from)}&to=${part(to)}`,
  crewSettings: () => '/api/crews/settings',
  daysOff: () => '/api/days-off',
  dayOff: (daysOffId: string) => `/api/days-off/${part(daysOffId)}`,
  closedDays: () => '/api/closed-days',
  feeds: () => '/api/feeds',
  /** A list of customers and jobs: looked at, brought in, taken away. */
  previewList: (said: Record<string, string>) =>
    `/api/imports/preview?${new URLSearchParams(said)}`,
  importList: (said: Record<string, string>) => `/api/imports?${new URLSearchParams(said)}`,
  exportJobs: () => '/api/exports/jobs',
  /** A calendar that others' programs read; the token is the whole of the permission. */
  feed: (token: string) => `/api/feeds/${part(token)}.ics`,
  /** The stream of what changes in the shop. */
  live: () => '/api/live',
  /** The line of a day's drive. */
  travel: () => '/api/travel',
  /** Where a typed address is. */
  geocode: () => '/api/geocode',
  tools: () => '/api/tools',
  tool: (toolId: string) => `/api/tools/${part(toolId)}`,
  rules: () => '/api/rules',
  /** What a change of the rules would do. */
  rulesPreview: () => '/api/rules/preview',
  /** What takes one change of them back. */
  ruleChangeBack: (changeId: string) => `/api/rules/changes/${part(changeId)}`,
  messages: () => '/api/messages',
  schedulerItems: () => '/api/messages/items',
  schedulerItem: (itemId: string) => `/api/messages/items/${part(itemId)}`,
  wordings: () => '/api/messages/wordings',
  messageSettings: () => '/api/messages/settings',
  messageTest: () => '/api/messages/test',
  customerConsent: (customerId: string) => `/api/customers/${part(customerId)}/consent`,
  customerLanguage: (customerId: string) => `/api/customers/${part(customerId)}/language`,

  customerVisit: (token: string) => `/api/v/${part(token)}`,
  /** Where the texting provider posts texts from customers and reports on ours. */
  smsWebhook: () => '/api/webhooks/sms',
  smsStatusWebhook: () => '/api/webhooks/sms/status',
  health: () => '/api/health',
} as const;

/** What an address may be written with (RFC 3986, 2). */
const addressShape = /^\/(?!\/)[\w\-.~:/?#[\]@!$&'()*+,;=%]*$/;

/**
 * An address on this site, or the fallback. Anything else ("https://…", "//…", "/\…") could lead a
 * person who has just signed in to a stranger's page.
 * Example: `safeNext('//evil.example', '/diary')` is `/diary`.
 */
export function safeNext(next: string | null | undefined, fallback: string): string {
  return next && addressShape.test(next) ? next : fallback;
}
