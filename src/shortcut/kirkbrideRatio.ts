/**
 * Kirkbride's rectifying over stripping stages,
 * [(z_HK / z_LK) (x_LK,B / x_HK,D)² (B / D)]^0.206, from the three ratios.
 */
export function kirkbrideRatio(feedKeys: number, impurities: number, flows: number): number {
  return Math.exp(0.206 * Math.log(feedKeys * impurities * impurities * flows));
}
