export interface Price {
  /** In minor units. */
  amount: number
  currency: string
}

export function formatPrice({ amount, currency }: Price) {
  if (amount === 0) return 'Free'
  const format = new Intl.NumberFormat('en-GB', {
    style: 'currency',
    currency,
    trailingZeroDisplay: 'stripIfInteger',
  })
  return format.format(amount / 10 ** (format.resolvedOptions().maximumFractionDigits ?? 2))
}
