/** Benefit travels as whole ten-thousandths of a point and is read as decimal text: 8187213 is "818.7213". */
export function formatPoints(tenThousandths: number): string {
  return (tenThousandths / 10_000).toFixed(4);
}
