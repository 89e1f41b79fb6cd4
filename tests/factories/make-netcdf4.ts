import h5wasm from "h5wasm";

export interface Hdf5Variable {
  name: string;
  values: Float64Array | Float32Array | Int32Array | Int16Array | Uint16Array | string[];
  /** Names of variables that are the scales of the dimensions. */
  dimensions: string[];
  shape: number[];
  attributes?: Record<string, string | number>;
}

/** Writes a small NetCDF-4 file with the HDF5 library itself: chunked, deflated, with dimension scales. */
export async function makeNetcdf4(variables: Hdf5Variable[]): Promise<Uint8Array> {
  const { FS } = await h5wasm.ready;
  const file = new h5wasm.File("/made", "w");
  for (const { name, values, shape, attributes = {} } of variables) {
    const compression = Array.isArray(values)
      ? {}
      : { chunks: shape.map((length) => Math.ceil(length / 2)), compression: 4 };
    const dataset = file.create_dataset({ name, data: values, shape, ...compression });
    for (const [attribute, value] of Object.entries(attributes)) dataset.create_attribute(attribute, value);
  }
  for (const { name, dimensions } of variables) {
    const dataset = file.get(name);
    if (dataset instanceof h5wasm.Dataset && dimensions.length === 1 && dimensions[0] === name)
      dataset.make_scale(name);
  }
  for (const { name, dimensions } of variables) {
    const dataset = file.get(name);
    if (!(dataset instanceof h5wasm.Dataset) || dimensions[0] === name) continue;
    for (const [axis, dimension] of dimensions.entries()) dataset.attach_scale(axis, `/${dimension}`);
  }
  file.close();
  const bytes = FS.readFile("/made");
  FS.unlink("/made");
  return bytes;
}
