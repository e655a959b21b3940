/** Money to two significant figures with its currency: '8.4 million EUR', '950 thousand EUR'. */
export function sayMoney(amount: number, currency: string): string {
  const size = Math.abs(amount);
  const rounded = size === 0 ? 0 : Number(amount.toPrecision(2));
  const top = Math.abs(rounded);
  if (top >= 1e6) return `${plain(rounded / 1e6)} million ${currency}`;
  if (top >= 1e3) return `${plain(rounded / 1e3)} thousand ${currency}`;
  return `${plain(rounded)} ${currency}`;
}

const plain = (value: number): string => {
  const text = Number(value.toPrecision(2)).toString();
  // Two figures are shown even where the second is a nought: 8.0, not 8.
  return Math.abs(value) < 10 && value !== 0 && !text.includes('.') ? `${text}.0` : text;
};

/** Odds in steps of 5 %; the ends say so rather than claim certainty. */
export function sayOdds(share: number): string {
  if (share > 0 && share < 0.025) return 'less than 5 %';
  if (share < 1 && share >= 0.975) return 'more than 95 %';
  return `${Math.round(share * 20) * 5} %`;
}
