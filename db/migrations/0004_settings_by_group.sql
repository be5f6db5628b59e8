-- Settings are named by their group now; those of the first edition move.
UPDATE "settings" SET "key" = CASE "key"
  WHEN 'programme' THEN 'programme.name'
  WHEN 'pricePerSegment' THEN 'programme.pricePerSegment'
  WHEN 'currency' THEN 'programme.currency'
  WHEN 'textsPerMinute' THEN 'programme.textsPerMinute'
  WHEN 'litresPerPersonDay' THEN 'need.litresPerPersonDay'
  WHEN 'flowCheckDays' THEN 'wash.flowCheckDays'
  ELSE "key"
END;
