/** Rows of `shop_settings`. */
export const FORCE_FACTORS = "force factors";
