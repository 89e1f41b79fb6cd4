import { sha256 } from "@noble/hashes/sha2.js";
import { bytesToHex, utf8ToBytes } from "@noble/hashes/utils.js";
import { canonicalJson } from "./canonical-json";
import type { Scenario } from "./scenario";

/** SHA-256 of the scenario's canonical JSON, 64 hexadecimal digits: equal inputs, equal hash. */
export function inputHash(scenario: Scenario): string {
  return bytesToHex(sha256(utf8ToBytes(canonicalJson(scenario))));
}
