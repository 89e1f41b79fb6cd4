import { describe, expect, it } from "vitest";
import { kindOfFile } from "./kind-of-file";

const kindOf = (text: string) => kindOfFile(new TextEncoder().encode(text), "file");

describe("what a file is by its content", () => {
  it.each([
    ["a table of depths", "Pressure (Decibar),Temperature (Celsius),Salinity (PSU)\n1,20,35\n", "cast"],
    ["an exchange cast", "CTD,20310101X\n", "cast"],
    ["a deck", "AL, 97, 2031090100,   , BEST,   0, 172N,  370W,  30, 1006\n", "track"],
    ["a header of a storm", "AL972031,             PELLAN,      2,\n", "track"],
    ["GeoJSON", '{"type":"Polygon","coordinates":[]}', "shape"],
    ["KML", '<?xml version="1.0"?><kml xmlns="x"></kml>', "shape"],
    ["a record of weather", "time,wind speed,pressure,temperature,salinity\n2031-01-01,5,1000,20,35\n", "series"],
    ["anything else", "hello", "series"],
  ])("%s", (_, text, kind) => {
    expect(kindOf(text)).toBe(kind);
  });
});
