import { describe, expect, test } from "vitest";
import { digestOf, sha256Hex } from "@/lib/domain/digest";
import { canonicalText, findJsonFault, pointerStep } from "@/lib/domain/json";

describe("canonical JSON, RFC 8785", () => {
  test("the author's public test data `arrays`", () => {
    const text = canonicalText(JSON.parse('[56,{"d":true,"10":null,"1":[]}]'));
    expect(text).toBe('[56,{"1":[],"10":null,"d":true}]');
    // SHA-256 of the canonical output, as published with the data.
    expect(sha256Hex(text)).toBe("099601b171cafed97c333f8878d68e7f8c8f795412adb34b2fdcf0e7c7beac42");
  });

  // RFC 8785, 3.2.2 and 3.2.3; from memory, unverified.
  test("the RFC's own examples of serialisation and of sorting", () => {
    const mixed = String.raw`{
      "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
      "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
      "literals": [null, true, false]
    }`;
    expect(canonicalText(JSON.parse(mixed))).toBe(
      String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],` +
        String.raw`"string":"€$\u000f\nA'B\"\\\\\"/"}`,
    );
    const names = String.raw`{"\u20ac":1,"\r":2,"\ufb33":3,"1":4,"\ud83d\ude00":5,"\u0080":6,"\u00f6":7}`;
    expect(Object.values(JSON.parse(canonicalText(JSON.parse(names))) as object).sort()).toHaveLength(7);
    expect([...canonicalText(JSON.parse(names)).matchAll(/:(\d)/g)].map(([, digit]) => digit).join("")).toBe(
      "2467153",
    );
  });

  test.each([
    ["-0", "0"],
    ["1.0", "1"],
    ["1e2", "100"],
    ["0.000001", "0.000001"],
    ["9007199254740991", "9007199254740991"],
    ['"\\u00e9"', '"é"'],
    ['"\\u007f"', '"\u007f"'],
    ["{}", "{}"],
    ['{"__proto__":1,"a":2}', '{"__proto__":1,"a":2}'],
  ])("%s is written %s", (from, to) => {
    expect(canonicalText(JSON.parse(from))).toBe(to);
  });

  test("whatever JSON cannot say throws", () => {
    for (const value of [undefined, NaN, Infinity, "\ud800"]) expect(() => canonicalText(value)).toThrow();
  });
});

describe("SHA-256 (RFC 6234 vectors)", () => {
  test.each([
    ["abc", "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad"],
    ["", "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855"],
  ])("of %o", (text, digest) => {
    expect(sha256Hex(text)).toBe(digest);
  });

  test("of a value is that of its canonical text, whatever the order of its members", () => {
    expect(digestOf({ b: 1, a: [2] })).toBe(sha256Hex('{"a":[2],"b":1}'));
    expect(digestOf({ a: [2], b: 1 })).toBe(digestOf({ b: 1, a: [2] }));
  });
});

describe("what a record must not hold", () => {
  const deep = (levels: number): unknown => (levels === 0 ? 1 : [deep(levels - 1)]);
  const most = Number.MAX_SAFE_INTEGER;

  test.each<[unknown, string | null, string]>([
    [0, null, ""],
    [most, null, ""],
    [-most, null, ""],
    [most + 1, "", "larger than 2^53-1"],
    [-most - 1, "", "larger than 2^53-1"],
    [1e300, "", "larger than 2^53-1"],
    [NaN, "", "not a finite number"],
    [-Infinity, "", "not a finite number"],
    [0.123456, null, ""],
    [0.1234567, "", "more than 6 decimals"],
    [1e-6, null, ""],
    [1e-7, "", "more than 6 decimals"],
    [1.5e-6, "", "more than 6 decimals"],
    [123456789.123456, null, ""],
    [0.1 + 0.2, "", "more than 6 decimals"],
    ["a\ud83d\ude00", null, ""],
    ["\ud83d", "", "a lone surrogate"],
    ["\ude00\ud83d", "", "a lone surrogate"],
    [{ a: [1, { "b/c~d": "\udfff" }] }, "/a/1/b~1c~0d", "a lone surrogate"],
    [{ "\ud800": 1 }, "/\ud800", "a lone surrogate"],
    [JSON.parse('{"__proto__":{"x":1e-9}}'), "/__proto__/x", "more than 6 decimals"],
    [deep(32), null, ""],
    [deep(33), "/0".repeat(32), "nested deeper than 32"],
    [[null, true, false, {}, []], null, ""],
  ])("%#: %o", (value, pointer, detail) => {
    expect(findJsonFault(value)).toEqual(pointer === null ? null : { pointer, detail });
  });

  // RFC 6901, 5; from memory, unverified.
  test.each([
    ["a/b", "/a~1b"],
    ["m~n", "/m~0n"],
    ["", "/"],
    ["~1", "/~01"],
    [0, "/0"],
  ])("pointer to %o", (name, pointer) => {
    expect(pointerStep(name)).toBe(pointer);
  });
});
