import type { StepParams } from '../ordered-steps';

/** Held by the database itself, whatever the application does: legal changes of state, frozen snapshots, four eyes. */
export async function up({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    CREATE FUNCTION guard_revision() RETURNS trigger LANGUAGE plpgsql AS $guard$
    BEGIN
      IF NEW.id <> OLD.id OR NEW.shop_id <> OLD.shop_id OR NEW.drawing_id <> OLD.drawing_id
        OR NEW.sequence <> OLD.sequence OR NEW.letter <> OLD.letter THEN
        RAISE EXCEPTION 'a revision keeps its identity' USING ERRCODE = 'restrict_violation';
      END IF;
      IF NEW.version <= OLD.version THEN
        RAISE EXCEPTION 'every change of a revision raises its version' USING ERRCODE = 'restrict_violation';
      END IF;
      IF NEW.state <> OLD.state AND (OLD.state, NEW.state) NOT IN (('draft', 'in review'), ('in review', 'draft'),
        ('in review', 'released'), ('released', 'superseded'), ('released', 'withdrawn')) THEN
        RAISE EXCEPTION 'a revision does not go from % to %', OLD.state, NEW.state USING ERRCODE = 'restrict_violation';
      END IF;
      IF OLD.state <> 'draft' AND ROW(NEW.title, NEW.note, NEW.change, NEW.template, NEW.template_hash, NEW.engine,
        NEW.entry_unit, NEW.settings, NEW.typed, NEW.evaluated, NEW.problems, NEW.register_id, NEW.schema_version,
        NEW.part, NEW.scheme, NEW.route, NEW.capacity, NEW.faults, NEW.content_hash, NEW.saved_by, NEW.saved_at,
        NEW.trial, NEW.created_at)
        IS DISTINCT FROM ROW(OLD.title, OLD.note, OLD.change, OLD.template, OLD.template_hash, OLD.engine,
        OLD.entry_unit, OLD.settings, OLD.typed, OLD.evaluated, OLD.problems, OLD.register_id, OLD.schema_version,
        OLD.part, OLD.scheme, OLD.route, OLD.capacity, OLD.faults, OLD.content_hash, OLD.saved_by, OLD.saved_at,
        OLD.trial, OLD.created_at) THEN
        RAISE EXCEPTION 'only a draft changes' USING ERRCODE = 'restrict_violation';
      END IF;
      IF OLD.state NOT IN ('draft', 'in review') AND (NEW.state = OLD.state
        OR ROW(NEW.sheet, NEW.findings, NEW.svg_hash, NEW.pdf_hash, NEW.drawn_by, NEW.drawn_at, NEW.checked_by,
          NEW.checked_at, NEW.no_second_check, NEW.returned)
        IS DISTINCT FROM ROW(OLD.sheet, OLD.findings, OLD.svg_hash, OLD.pdf_hash, OLD.drawn_by, OLD.drawn_at,
          OLD.checked_by, OLD.checked_at, OLD.no_second_check, OLD.returned)) THEN
        RAISE EXCEPTION 'a released revision does not change' USING ERRCODE = 'restrict_violation';
      END IF;
      IF NEW.state = 'released' AND OLD.state = 'in review' THEN
        IF NEW.no_second_check THEN
          IF NOT EXISTS (SELECT 1 FROM shops WHERE id = NEW.shop_id AND self_release) THEN
            RAISE EXCEPTION 'this shop does not release without a second check' USING ERRCODE = 'restrict_violation';
          END IF;
        ELSIF EXISTS (SELECT 1 FROM revision_editors WHERE shop_id = NEW.shop_id AND revision_id = NEW.id
          AND person_id = NEW.checked_by) OR NEW.checked_by = NEW.drawn_by THEN
          RAISE EXCEPTION 'nobody approves their own' USING ERRCODE = 'restrict_violation';
        END IF;
      END IF;
      RETURN NEW;
    END $guard$;
    CREATE TRIGGER guard_revision BEFORE UPDATE ON revisions FOR EACH ROW EXECUTE FUNCTION guard_revision();
    CREATE FUNCTION guard_new_revision() RETURNS trigger LANGUAGE plpgsql AS $guard$
    BEGIN
      IF NEW.state <> 'draft' THEN
        RAISE EXCEPTION 'a revision starts as a draft' USING ERRCODE = 'restrict_violation';
      END IF;
      RETURN NEW;
    END $guard$;
    CREATE TRIGGER guard_new_revision BEFORE INSERT ON revisions FOR EACH ROW EXECUTE FUNCTION guard_new_revision();
    CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $guard$
    BEGIN
      RAISE EXCEPTION 'rows of % are only ever added', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
    END $guard$;
    CREATE TRIGGER audit_events_only_added BEFORE UPDATE OR DELETE ON audit_events
      FOR EACH ROW EXECUTE FUNCTION refuse_change();
    CREATE TRIGGER decisions_only_added BEFORE UPDATE OR DELETE ON decisions
      FOR EACH ROW EXECUTE FUNCTION refuse_change();
    CREATE TRIGGER registers_only_added BEFORE UPDATE OR DELETE ON registers
      FOR EACH ROW EXECUTE FUNCTION refuse_change();
  `);
}

export async function down({ context }: StepParams): Promise<void> {
  await context.sequelize.query(`
    DROP TRIGGER registers_only_added ON registers;
    DROP TRIGGER decisions_only_added ON decisions;
    DROP TRIGGER audit_events_only_added ON audit_events;
    DROP TRIGGER guard_new_revision ON revisions;
    DROP TRIGGER guard_revision ON revisions;
    DROP FUNCTION refuse_change();
    DROP FUNCTION guard_new_revision();
    DROP FUNCTION guard_revision();
  `);
}
