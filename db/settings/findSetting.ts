import type { Connection } from "../connection";

export interface SettingRow {
  readonly value: unknown;
  readonly version: number;
  readonly updated_at: Date;
  readonly updated_by: string | null;
}

export async function findSetting(db: Connection, subject: string): Promise<SettingRow | undefined> {
  const rows: SettingRow[] = await db("shop_settings as setting").leftJoin("users as author", "author.id", "setting.updated_by")
    .where("setting.subject", subject).select(["setting.value", "setting.version", "setting.updated_at", "author.name as updated_by"]);
  return rows[0];
}
