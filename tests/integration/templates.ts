/** Databases that every test file may copy: migrated and empty, and with the demonstration shop in it. */
export const EMPTY_TEMPLATE = "foldwright_empty";
export const SHOP_TEMPLATE = "foldwright_shop";
