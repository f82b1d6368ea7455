/**
 * Ids of the parts that may replace `$partId`: those under the same company part number, whatever they are, and those of the
 * same resistance that fit the same place: the same land pattern and mounting, or where the datasheet names no land pattern,
 * the same body style and size code.
 */
export const fittingPartsSql = `
  WITH own AS (SELECT p.*, r.land_pattern, r.mounting, r.body_style, s.code, s.metric_code
      FROM parts AS p JOIN families AS f ON f.id = p.family_id JOIN sizes AS s ON s.id = p.size_id
        JOIN size_ratings AS r ON r.revision_id = f.current_revision_id AND r.size_id = p.size_id
      WHERE p.id = $partId),
    fitting AS (SELECT s.id FROM own, sizes AS s JOIN families AS f ON f.id = s.family_id
        JOIN size_ratings AS r ON r.revision_id = f.current_revision_id AND r.size_id = s.id
      WHERE r.mounting = own.mounting AND CASE WHEN own.land_pattern IS NULL
        THEN r.land_pattern IS NULL AND r.body_style = own.body_style AND s.code = own.code
          AND s.metric_code IS own.metric_code
        ELSE r.land_pattern = own.land_pattern END)
  SELECT p.id FROM own, fitting JOIN parts AS p ON p.size_id = fitting.id
    AND p.resistance_ohm BETWEEN own.resistance_ohm * (1 - 1e-9) AND own.resistance_ohm * (1 + 1e-9)
  WHERE p.id <> own.id
  UNION
  SELECT other.part_id FROM approved_sources AS mine
    JOIN approved_sources AS other ON other.company_part_number_id = mine.company_part_number_id
  WHERE mine.part_id = $partId AND other.part_id <> mine.part_id`;

/** Form and place of each of these sizes, by its family's current revision; binds a JSON array of ids. */
export const formsOfSizesSql = `
  SELECT s.id AS size_id, r.body_style, r.termination, r.land_pattern FROM sizes AS s
    JOIN families AS f ON f.id = s.family_id
    JOIN size_ratings AS r ON r.revision_id = f.current_revision_id AND r.size_id = s.id
  WHERE s.id IN (SELECT value FROM json_each($sizes))`;

export interface FormOfSize {
  size_id: number;
  body_style: string;
  termination: string | null;
  land_pattern: string | null;
}
