import type { Knex } from "knex";

export async function up(db: Knex): Promise<void> {
  await db.schema.createTable("users", (table) => {
    table.uuid("id").primary().defaultTo(db.fn.uuid());
    table.text("email").notNullable().unique();
    table.text("name").notNullable();
    table.text("role").notNullable();
    table.text("password_hash").notNullable();
    table.timestamp("disabled_at");
    table.timestamp("created_at").notNullable().defaultTo(db.fn.now());
    table.timestamp("updated_at").notNullable().defaultTo(db.fn.now());
    table.check("role in ('engineer', 'operator', 'toolroom', 'manager')", {}, "users_role_known");
    table.check("email = lower(email) and length(email) between 3 and 254 and position('@' in email) > 1", {}, "users_email_plain");
    table.check("length(trim(name)) between 1 and 120", {}, "users_name_given");
    table.check("password_hash like '$2_$__$%' and length(password_hash) = 60", {}, "users_password_hashed");
  });

  await db.schema.createTable("sign_in_attempts", (table) => {
    table.bigIncrements("id");
    table.text("email").notNullable();
    table.text("address").notNullable();
    table.boolean("succeeded").notNullable().defaultTo(false);
    table.timestamp("at").notNullable().defaultTo(db.fn.now());
    table.index(["email", "at"]);
    table.index(["address", "at"]);
    table.index(["at"]);
  });

  await db.schema.createTable("audit_events", (table) => {
    table.bigIncrements("id");
    table.timestamp("at").notNullable().defaultTo(db.fn.now());
    table.uuid("actor_id").references("users.id").onDelete("SET NULL");
    table.text("actor").notNullable();
    table.text("action").notNullable();
    table.text("subject").notNullable();
    table.text("detail").notNullable().defaultTo("");
    table.check("length(action) between 1 and 100", {}, "audit_events_action_given");
    table.index(["at", "id"]);
    table.index(["actor_id"]);
    table.index(["action"]);
  });
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable("audit_events");
  await db.schema.dropTable("sign_in_attempts");
  await db.schema.dropTable("users");
}
