/** A form that was sent by nobody signed in: the page it stands on cannot be drawn for them, so what was typed goes along. */
export class SignedOutForm extends Error {
  readonly values: Readonly<Record<string, string>>;
  constructor(values: Readonly<Record<string, string>>) {
    super('Nothing was done, and nothing of what you typed is lost.');
    this.values = values;
  }
}
