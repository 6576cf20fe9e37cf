import type { StepParams } from '../ordered-steps';

/**
 * Self-release is for a shop where no second person may check: it goes off by itself when one joins, and cannot be
 * switched on while there is one.
 */
export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE FUNCTION checkers_of(shop uuid) RETURNS bigint LANGUAGE sql STABLE AS $$
      SELECT count(*) FROM memberships WHERE shop_id = shop AND roles && ARRAY['checker', 'lead']::text[]
    $$;
    CREATE FUNCTION end_self_release() RETURNS trigger LANGUAGE plpgsql AS $guard$
    BEGIN
      -- Whoever switches it on holds the same row: one of the two sees the other.
      PERFORM 1 FROM shops WHERE id = NEW.shop_id FOR UPDATE;
      IF checkers_of(NEW.shop_id) > 1 THEN
        UPDATE shops SET self_release = false, version = version + 1 WHERE id = NEW.shop_id AND self_release;
        IF FOUND THEN
          INSERT INTO audit_events (id, shop_id, person_id, act, detail, at)
            VALUES (gen_random_uuid(), NEW.shop_id, NEW.person_id, 'self-release ended', '{"why": "a second checker joined"}', now());
        END IF;
      END IF;
      RETURN NULL;
    END $guard$;
    CREATE TRIGGER end_self_release AFTER INSERT OR UPDATE ON memberships
      FOR EACH ROW EXECUTE FUNCTION end_self_release();
    CREATE FUNCTION guard_self_release() RETURNS trigger LANGUAGE plpgsql AS $guard$
    BEGIN
      IF NEW.self_release AND NOT OLD.self_release AND checkers_of(NEW.id) > 1 THEN
        RAISE EXCEPTION 'a second person may check here' USING ERRCODE = 'restrict_violation';
      END IF;
      RETURN NEW;
    END $guard$;
    CREATE TRIGGER guard_self_release BEFORE UPDATE ON shops FOR EACH ROW EXECUTE FUNCTION guard_self_release();
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    DROP TRIGGER guard_self_release ON shops;
    DROP FUNCTION guard_self_release();
    DROP TRIGGER end_self_release ON memberships;
    DROP FUNCTION end_self_release();
    DROP FUNCTION checkers_of(uuid);
  `);
}
