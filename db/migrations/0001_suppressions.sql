CREATE TABLE "suppressions" (
	"hash" text PRIMARY KEY NOT NULL,
	"key_mark" text NOT NULL,
	"at" timestamp (3) with time zone NOT NULL
);
