import { InvalidInput } from '../errors/domain-error.ts';

export interface Currency {
  code: string;
  name: string;
  minorDigits: 0 | 2;
}

const two = (code: string, name: string): Currency => ({ code, name, minorDigits: 2 });
const none = (code: string, name: string): Currency => ({ code, name, minorDigits: 0 });

/**
 * Currencies a shop can keep its books in. Minor units by ISO 4217 (from memory), not by the
 * browser's own tables, which differ (HUF). Currencies with three decimals are left out, since
 * amounts are stored in hundredths.
 */
export const currencies: readonly Currency[] = [
  two('AUD', 'Australian dollar'),
  two('BRL', 'Brazilian real'),
  two('CAD', 'Canadian dollar'),
  two('CHF', 'Swiss franc'),
  none('CLP', 'Chilean peso'),
  two('CZK', 'Czech koruna'),
  two('DKK', 'Danish krone'),
  two('EUR', 'Euro'),
  two('GBP', 'Pound sterling'),
  two('HKD', 'Hong Kong dollar'),
  two('HUF', 'Hungarian forint'),
  two('ILS', 'Israeli new shekel'),
  two('INR', 'Indian rupee'),
  none('ISK', 'Icelandic króna'),
  none('JPY', 'Japanese yen'),
  none('KRW', 'South Korean won'),
  two('MXN', 'Mexican peso'),
  two('MYR', 'Malaysian ringgit'),
  two('NOK', 'Norwegian krone'),
  two('NZD', 'New Zealand dollar'),
  two('PHP', 'Philippine peso'),
  two('PLN', 'Polish złoty'),
  two('RON', 'Romanian leu'),
  two('SEK', 'Swedish krona'),
  two('SGD', 'Singapore dollar'),
  two('THB', 'Thai baht'),
  two('TRY', 'Turkish lira'),
  two('UAH', 'Ukrainian hryvnia'),
  two('USD', 'US dollar'),
  none('VND', 'Vietnamese đồng'),
  two('ZAR', 'South African rand'),
];

/** Decimals of a currency's amounts: 0 or 2. @throws InvalidInput for a code that is not in the table */
export function minorDigits(code: string): 0 | 2 {
  const currency = currencies.find((each) => each.code === code);
  if (!currency) {
    throw new InvalidInput('currency', 'Choose a currency from the list, such as EUR, GBP or USD.');
  }
  return currency.minorDigits;
}
