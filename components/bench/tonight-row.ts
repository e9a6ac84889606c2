import { productToHold, type HoldingProductResult, type Product } from '@/lib/brine/melt';

/** Something that could be put on the road tonight. */
export interface BenchProduct extends Product {
  readonly key: string;
  readonly name: string;
  readonly isLiquid: boolean;
  readonly densityKgPerM3: number;
  readonly costCentsPerTonne: number | null;
  readonly practicalMinimumC: number | null;
}

export interface TonightRow {
  readonly product: BenchProduct;
  readonly result: HoldingProductResult;
  /** mL/m² of a liquid, g/m² of a solid; `null` when refused. */
  readonly rate: number | null;
  /** Per m of lane `laneWidthM` wide. */
  readonly costCentsPerLaneM: number | null;
  readonly isBelowWorkingRange: boolean;
}

/** What each product would take to hold a film of water at a road temperature; nothing lost to traffic or run-off. */
export function tonightRow(
  product: BenchProduct,
  road: { tempC: number; waterMm: number; laneWidthM: number },
): TonightRow {
  // 1 mm of water on a square metre is a litre, 1,000 g.
  const result = productToHold(product, road.waterMm * 1000, road.tempC);
  const rateGPerM2 = result.ok ? result.productGPerM2 : null;
  const cost =
    rateGPerM2 === null || product.costCentsPerTonne === null
      ? null
      : (rateGPerM2 / 1_000_000) * road.laneWidthM * product.costCentsPerTonne;
  return {
    product,
    result,
    rate: rateGPerM2 === null ? null : product.isLiquid ? (1000 * rateGPerM2) / product.densityKgPerM3 : rateGPerM2,
    costCentsPerLaneM: cost,
    isBelowWorkingRange: product.practicalMinimumC !== null && road.tempC < product.practicalMinimumC,
  };
}
