/** `4.4 %` of a share 0 to 1; whole from ten per cent on where asked for. */
export function percent(share: number, digits = 1): string {
  return `${(share * 100).toFixed(digits)} %`;
}
