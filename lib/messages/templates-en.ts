/** What a new shop says in English. Texts are plain letters only, and never ask for a word that opts out. */
import type { OccasionTemplates } from './template';

export const templatesEn: OccasionTemplates = {
  booked: {
    sms: '{shop}: your {visit} is booked for {day}. We arrive {window}. Details and changes: {link}',
    subject: 'Your {visit} with {shop}: {day}',
    email: `Hello {customer},

Your {visit} at {address} is booked for {day}. We arrive {window}.

Who comes: {crew}.

See what to clear before we come, add it to your calendar, or ask for another time:
{link}

{shop}
{shopPhone}`,
  },
  'please-confirm': {
    sms: '{shop}: may we come {day}, {window}, for your {visit}? Reply YES, or CHANGE for another time. {link}',
    subject: 'Please confirm: {visit} on {day}',
    email: `Hello {customer},

We plan to come {day}, {window}, for your {visit} at {address}.

Please tell us with one tap that the time suits, or ask for another one:
{link}

{shop}
{shopPhone}`,
  },
  'asked-again': {
    sms: '{shop}: we have not heard from you. May we come {day}, {window}, for your {visit}? Reply YES, or CHANGE for another time. {link}',
    subject: 'Does this suit? {visit} on {day}',
    email: `Hello {customer},

We have not heard from you yet. We plan to come {day}, {window}, for your {visit} at {address}.

Please tell us with one tap that the time suits, or ask for another one:
{link}

{shop}
{shopPhone}`,
  },
  'day-before': {
    sms: '{shop}: a reminder that we come {day}, {window}, for your {visit}. What to clear: {link}',
    subject: 'A reminder: {visit} on {day}',
    email: `Hello {customer},

A reminder that we come {day}, {window}, for your {visit} at {address}.

What to clear before we come, and how to reach us:
{link}

{shop}
{shopPhone}`,
  },
  'on-my-way': {
    sms: '{shop}: we are on the way and arrive {window}. Questions: {shopPhone}',
    subject: 'On the way: {visit} today',
    email: `Hello {customer},

We are on the way for your {visit} at {address} and arrive {window}.

Who comes: {crew}.

{link}

{shop}
{shopPhone}`,
  },
  'running-late': {
    sms: '{shop}: sorry, we are about {minutesLate} minutes late and now arrive {arrival}. Questions: {shopPhone}',
    subject: 'We are running late',
    email: `Hello {customer},

We are sorry: we are about {minutesLate} minutes late for your {visit} and now arrive {arrival}.

{link}

{shop}
{shopPhone}`,
  },
  moved: {
    sms: '{shop}: your {visit} moves from {oldDay} to {day}, {window}. If that does not suit: {link}',
    subject: 'Moved: your {visit} is now on {day}',
    email: `Hello {customer},

Your {visit} at {address} moves from {oldDay}, {oldWindow}, to {day}. We arrive {window}.

If that does not suit, ask for another time:
{link}

{shop}
{shopPhone}`,
  },
  'moved-together': {
    sms: '{shop}: new times for your visits. {moves} Questions: {shopPhone}',
    subject: 'Moved: new times for your visits',
    email: `Hello {customer},

Your visits have new times:

{moves}

If one of them does not suit, ask for another time on its page, or ring us: {shopPhone}.

{shop}`,
  },
  'called-off': {
    sms: '{shop}: your {visit} on {day} is called off. We will talk to you about a new time. Questions: {shopPhone}',
    subject: 'Called off: {visit} on {day}',
    email: `Hello {customer},

Your {visit} on {day} at {address} is called off. {reason}

We will talk to you about a new time. You reach us at {shopPhone}.

{shop}`,
  },
  missed: {
    sms: '{shop}: we came for your {visit} and found nobody home. Please ring {shopPhone}, and we find another time.',
    subject: 'We missed you: {visit} on {day}',
    email: `Hello {customer},

We came to {address} on {day} for your {visit} and found nobody home.

Please ring us, and we find another time: {shopPhone}.

{shop}`,
  },
  'not-ready': {
    sms: '{shop}: noted, not ready yet: {missing}. We talk to you before {day}. Questions: {shopPhone}',
    subject: 'Noted: not ready yet for your {visit}',
    email: `Hello {customer},

We have noted what is not ready yet for your {visit} at {address}: {missing}.

We talk to you before {day}. When it is ready, tell us here or by phone:
{link}

{shop}
{shopPhone}`,
  },
  done: {
    sms: '{shop}: your {visit} is done. Thank you. How it stands: {link}',
    subject: 'Done: your {visit}',
    email: `Hello {customer},

Your {visit} at {address} is done. Thank you.

How it stands, and anything that is still open:
{link}

{shop}
{shopPhone}`,
  },
  'other-time': {
    sms: '{shop}: choose another time for your {visit} here: {link} Or ring {shopPhone}.',
    subject: '',
    email: '',
  },
  'which-visit': {
    sms: '{shop}: which visit do you mean? Reply {choices}. Or ring {shopPhone}.',
    subject: '',
    email: '',
  },
  help: {
    sms: '{shop}: we text you about your visits only. Ring us at {shopPhone}.',
    subject: '',
    email: '',
  },
};
