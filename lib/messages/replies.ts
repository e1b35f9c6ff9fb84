/** What a customer's text means. In doubt it is unclear, and a person reads it: nothing is confirmed by a guess. */
import {
  changePhrases,
  changeWords,
  helpWords,
  noWords,
  politeWords,
  startWords,
  stopPhrases,
  stopWords,
  visitCancelPhrases,
  visitCancelWords,
  yesWords,
} from './reply-words';

export type ReplyMeaning =
  /** Confirms the visit that awaits an answer. */
  | 'yes'
  /** Does not suit. Treated like `change`. */
  | 'no'
  /** Another time, please. */
  | 'change'
  /** No more texts, at once. */
  | 'stop'
  | 'start'
  | 'help'
  /** To the scheduler's list. */
  | 'unclear';

export type Reply = {
  meaning: ReplyMeaning;
  /** It may be about the visit itself, which is not called off by a text: the scheduler looks. */
  mayCallOffVisit: boolean;
};

/**
 * Reads an answer. Capitals, accents and punctuation do not matter; a thumb up is a yes. A yes holds alone or
 * with courtesies ("Yes, thank you!"), not with anything more ("Yes but later" is unclear).
 * CANCEL by itself is an opt-out by law and by the provider, and may mean the visit.
 * Example: "SÍ, gracias" is yes; "Can we do another day?" is change; "CANCEL" is stop, with `mayCallOffVisit`.
 */
export function understandReply(text: string): Reply {
  const said = normalised(text);
  const whole = (words: readonly string[]) => words.includes(said);
  const somewhere = (phrases: readonly string[]) =>
    phrases.some((phrase) => ` ${said} `.includes(` ${phrase} `));
  const reply = (meaning: ReplyMeaning, mayCallOffVisit = false): Reply => ({
    meaning,
    mayCallOffVisit,
  });

  if (whole(stopWords)) return reply('stop', whole(visitCancelWords));
  if (somewhere(stopPhrases)) return reply('stop', somewhere(visitCancelPhrases));
  if (whole(startWords)) return reply('start');
  if (whole(helpWords)) return reply('help');
  if (somewhere(visitCancelPhrases)) return reply('unclear', true);
  if (whole(noWords)) return reply('no');
  if (whole(changeWords) || somewhere(changePhrases)) return reply('change');
  if (isYes(said)) return reply('yes');
  return reply('unclear');
}

const thumbUp = /\u{1F44D}\p{Emoji_Modifier}?|\u2705|\u{1F44C}\p{Emoji_Modifier}?/gu;

/** Small letters, no accents, one space between words, a thumb up as "yes". */
function normalised(text: string): string {
  return text
    .replace(thumbUp, ' yes ')
    .normalize('NFD')
    .replace(/\p{Mn}/gu, '')
    .toLowerCase()
    .replace(/['\u2018\u2019`]/g, '')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}

/** One yes, the rest courtesies; the same yes twice is still one ("Yes yes", "OK 👍"). */
function isYes(said: string): boolean {
  if (yesWords.includes(said)) return true;
  const words = said.split(' ').filter((word) => !politeWords.includes(word));
  return words.length > 0 && (yesWords.includes(words.join(' ')) || words.every(isYesWord));
}

function isYesWord(word: string): boolean {
  return yesWords.includes(word);
}
