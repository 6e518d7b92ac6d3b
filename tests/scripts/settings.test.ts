import { describe, expect, it } from "vitest";
import { readSettings } from "@/lib/server/settings";

describe("readSettings", () => {
  it("needs nothing to be set, as a build has nothing", () => {
    expect(readSettings({})).toMatchObject({
      PORT: 3000,
      HOST: "127.0.0.1",
      ORIGIN: "http://127.0.0.1:3000",
      DATA_DIR: ".data",
      KEYS_DIR: ".data/keys",
      PHOTOS_DIR: ".data/photos",
      DEMO: false,
      NEXT_DIST_DIR: ".next",
      cookie: { name: "hookfast", secure: false },
    });
  });

  it("asks for a database only when one is wanted", () => {
    expect(() => readSettings({}).DATABASE_URL).toThrow("DATABASE_URL is not set");
    const url = "mariadb://a:b@127.0.0.1:3306/hookfast";
    expect(readSettings({ DATABASE_URL: url }).DATABASE_URL).toBe(url);
  });

  it("takes an empty line for the default", () => {
    expect(readSettings({ PORT: "", ORIGIN: "", DEMO: "" }).ORIGIN).toBe("http://127.0.0.1:3000");
  });

  it.each([
    [{ PORT: "4000" }, "http://127.0.0.1:4000", "hookfast", false],
    [{ ORIGIN: "http://localhost:3000" }, "http://localhost:3000", "hookfast", false],
    [{ ORIGIN: "http://[::1]:3000" }, "http://[::1]:3000", "hookfast", false],
    [{ ORIGIN: "https://hookfast.example" }, "https://hookfast.example", "__Host-hookfast", true],
    [{ ORIGIN: "https://hookfast.example:8443/" }, "https://hookfast.example:8443", "__Host-hookfast", true],
    [{ ORIGIN: "https://127.0.0.1:8443" }, "https://127.0.0.1:8443", "__Host-hookfast", true],
  ])("lets the origin of %j decide the cookie", (env, origin, name, secure) => {
    expect(readSettings(env).ORIGIN).toBe(origin);
    expect(readSettings(env).cookie).toEqual({ name, secure });
  });

  it.each([
    [{ ORIGIN: "http://hookfast.example" }, "sessions over plain http stay on this machine"],
    [{ ORIGIN: "http://127.0.0.1.hookfast.example" }, "sessions over plain http stay on this machine"],
    [{ ORIGIN: "hookfast.example" }, 'not "hookfast.example"'],
    [{ ORIGIN: "https://hookfast.example/app" }, 'not "https://hookfast.example/app"'],
    [{ ORIGIN: "https://me@hookfast.example" }, 'not "https://me@hookfast.example"'],
    [{ ORIGIN: "ftp://hookfast.example" }, "ORIGIN has to begin with https"],
    [{ PORT: "0" }, "PORT has to be a number from 1 to 65535"],
    [{ PORT: "x" }, "PORT has to be a number from 1 to 65535"],
    [{ DATABASE_URL: "mysql://127.0.0.1/hookfast" }, "DATABASE_URL has to be a mariadb:// URL"],
    [{ DEMO: "yes" }, "DEMO has to be 0 or 1"],
  ])("refuses %j", (env, sentence) => {
    expect(() => readSettings(env)).toThrow(sentence);
  });
});
