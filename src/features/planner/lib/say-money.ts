/** `1,240.00`: a price has no currency here, it is in whatever the prices were typed in. */
export const sayMoney = (amount: number): string =>
  amount.toLocaleString('en-US', { minimumFractionDigits: 2, maximumFractionDigits: 2 });
