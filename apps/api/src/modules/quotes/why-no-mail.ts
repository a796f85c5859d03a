/** Why a quote cannot go to a customer by mail, and what to do instead; null where it can. */
export function whyNoMail(
  customer: { name: string; email: string },
  mailAvailable: boolean,
): string | null {
  if (!mailAvailable)
    return 'No mail server is set, so send it by hand: copy the link and the text.';
  if (customer.email !== '') return null;
  return `${customer.name} has no e-mail address. Enter one with the customer, or send it by hand.`;
}
