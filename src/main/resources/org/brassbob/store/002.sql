-- What was once entered stays: a correction is a new row.
CREATE TRIGGER reading_stays BEFORE UPDATE ON reading BEGIN SELECT RAISE(ABORT, 'a reading stays as it was entered'); END;
CREATE TRIGGER reading_is_kept BEFORE DELETE ON reading BEGIN SELECT RAISE(ABORT, 'a reading is kept'); END;
CREATE TRIGGER gauging_stays BEFORE UPDATE ON gauging BEGIN SELECT RAISE(ABORT, 'a gauging stays as it was entered'); END;
CREATE TRIGGER gauging_is_kept BEFORE DELETE ON gauging BEGIN SELECT RAISE(ABORT, 'a gauging is kept'); END;
CREATE TRIGGER weight_stays BEFORE UPDATE ON weight BEGIN SELECT RAISE(ABORT, 'a weight stays as it was entered'); END;
CREATE TRIGGER weight_is_kept BEFORE DELETE ON weight BEGIN SELECT RAISE(ABORT, 'a weight is kept'); END;
