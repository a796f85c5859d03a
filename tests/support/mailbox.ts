export interface Mail {
  to: string;
  subject: string;
  date: string;
  text: string;
  links: string[];
}

/** Waits for a mail that fits, since mail is sent in the background. */
export async function mailThat(
  mailboxUrl: string,
  fits: (mail: Mail) => boolean,
  patienceMs = 60_000,
): Promise<Mail> {
  const until = performance.now() + patienceMs;
  while (performance.now() < until) {
    const mails = (await (await fetch(`${mailboxUrl}/messages`)).json()) as Mail[];
    const found = mails.find(fits);
    if (found) return found;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new Error('No such mail has come.');
}
