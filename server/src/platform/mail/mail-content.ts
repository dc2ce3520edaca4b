/** What a mail says, once; the plain text and the HTML are both made from it. */
export interface MailContent {
  readonly heading: string;
  /** Paragraphs before the facts and the link. */
  readonly paragraphs: readonly string[];
  /** Named values, such as an order's lines and its total. */
  readonly facts?: readonly (readonly [label: string, value: string])[];
  /** The one thing to do. The address begins with BASE_URL; secrets stand behind `#`, where no server logs them. */
  readonly action?: { readonly label: string; readonly url: string };
  /** Paragraphs after the link: how long it works, what to do if it was not asked for. */
  readonly closing?: readonly string[];
  /** A caution that belongs to what the mail is about. */
  readonly caution?: string;
}

/** Who writes: stands at the top and the bottom of every mail. */
export interface Letterhead {
  readonly name: string;
  /** Lines under the mail: address, VAT number, how to reach the shop. */
  readonly lines: readonly string[];
}
