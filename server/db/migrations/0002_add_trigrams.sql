-- Finds names with slips of the finger. A trusted extension: the owner of the database may add it.
CREATE EXTENSION IF NOT EXISTS pg_trgm;
