import { openClassic } from "./classic-file";
import { openHdf5 } from "./hdf5-file.server";
import type { NetcdfFile } from "./netcdf-file";

/**
 * Opens a NetCDF file of any kind. Close it when done.
 * @throws DamagedNetcdf where it cannot be read
 */
export function openNetcdf(bytes: Uint8Array): NetcdfFile {
  return bytes[0] === 0x43 ? openClassic(bytes) : openHdf5(bytes);
}
