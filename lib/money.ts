/** '$1,250': whole dollars, for amounts that are estimates. */
export const dollarWords = (cents: number): string => (cents / 100).toLocaleString('en-US', { style: 'currency', currency: 'USD', maximumFractionDigits: 0 });
