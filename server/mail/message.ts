/** A mail before it is encoded. Names and words may hold anything: the encoder keeps them out of the headers' way. */
export interface MailMessage {
  /** Id of the outbox row: the same mail always has the same Message-ID. */
  id: string;
  to: { name: string; address: string };
  subject: string;
  text: string;
  html: string;
}
