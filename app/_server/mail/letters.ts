import "server-only";

export interface Letter {
  subject: string;
  text: string;
}

/** What each letter says. `link` is an address of ours, or empty. No typed name stands in one: strangers could write with it. */
export const letters = {
  check: ({ link }) => ({
    subject: "Is this your address?",
    text: paragraphs(
      "Somebody, we hope you, wants to weigh yards with Stillyard under this address.",
      `Open this within a day to say that it is yours:\n${link}`,
      "Was it not you? Then do nothing, and nothing comes of it.",
    ),
  }),
  alreadyHere: ({ link }) => ({
    subject: "You already have an account",
    text: paragraphs(
      "Somebody, we hope you, wanted to sign up with Stillyard under this address. It already has an account.",
      `Should the password be gone, make a new one here:\n${link}`,
      "Was it not you? Then do nothing: your account is as it was.",
    ),
  }),
  password: ({ link }) => ({
    subject: "A new password",
    text: paragraphs(
      "Somebody, we hope you, asked for a new password at Stillyard.",
      `Choose it here within half an hour; all devices are signed out then:\n${link}`,
      "Was it not you? Then do nothing: the old password holds.",
    ),
  }),
  passwordChanged: ({ link }) => ({
    subject: "Your password was changed",
    text: paragraphs(
      "The password of your account at Stillyard was changed just now, and all other devices were signed out.",
      `Was it not you? Then make a new one at once:\n${link}`,
    ),
  }),
  move: ({ link }) => ({
    subject: "Is this your new address?",
    text: paragraphs(
      "An account at Stillyard is to move to this address.",
      `Open this within an hour to say that it is yours:\n${link}`,
      "Was it not you? Then do nothing, and nothing comes of it.",
    ),
  }),
  undo: ({ link }) => ({
    subject: "Your account is to move to another address",
    text: paragraphs(
      "Somebody, we hope you, asked for your account at Stillyard to move to another e-mail address.",
      `Was it not you? Then open this within seven days: the account stays with this address, all devices are signed out, and you choose a new password.\n${link}`,
    ),
  }),
} satisfies Record<string, (given: { link: string }) => Letter>;

export type LetterName = keyof typeof letters;

const paragraphs = (...words: string[]) => `Hello,\n\n${words.join("\n\n")}\n\nStillyard\n`;
