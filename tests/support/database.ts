if (!process.env["TEST_DATABASE_URL"]) {
  throw new Error(
    "These tests need a MariaDB server: run them through `npm test`, or set TEST_DATABASE_URL=mysql://user@host:port.",
  );
}
