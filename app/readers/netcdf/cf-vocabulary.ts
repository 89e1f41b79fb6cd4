import type { ValueRole } from "../propose-columns";

/** What a name says of the quantity behind it. */
export interface Meaning {
  role: ValueRole;
  /** Which way a flux counts: `down` into the sea, `up` out of it. */
  sense?: "down" | "up";
  /** Radiation: what arrives, or what remains after what leaves. */
  balance?: "incoming" | "net";
  /** m above the sea, where the name fixes it. */
  height?: number;
  /** Of several variables for a channel, the lower goes first. */
  rank?: number;
}

/**
 * CF standard names of what is read. Source: CF standard-name table, version 80. The sense stands in the names, and it
 * is opposite between neighbours of one file: sensible heat `downward`, latent heat `upward`.
 */
export const STANDARD_NAMES: ReadonlyMap<string, Meaning> = new Map<string, Meaning>([
  ["wind_speed", { role: "windSpeed" }],
  ["wind_speed_of_gust", { role: "windGust" }],
  ["wind_from_direction", { role: "windFrom" }],
  ["wind_to_direction", { role: "windTowards" }],
  ["eastward_wind", { role: "windU" }],
  ["northward_wind", { role: "windV" }],
  ["rainfall_flux", { role: "rain" }],
  ["rainfall_rate", { role: "rain" }],
  ["rainfall_amount", { role: "rain" }],
  ["thickness_of_rainfall_amount", { role: "rain" }],
  ["precipitation_flux", { role: "rain", rank: 1 }],
  ["precipitation_amount", { role: "rain", rank: 1 }],
  ["lwe_precipitation_rate", { role: "rain", rank: 1 }],
  ["lwe_thickness_of_precipitation_amount", { role: "rain", rank: 1 }],
  ["air_temperature", { role: "airTemperature" }],
  ["dew_point_temperature", { role: "dewPoint" }],
  ["relative_humidity", { role: "relativeHumidity" }],
  ["air_pressure_at_mean_sea_level", { role: "airPressure" }],
  ["air_pressure_at_sea_level", { role: "airPressure" }],
  ["surface_air_pressure", { role: "airPressure", rank: 1 }],
  ["air_pressure", { role: "airPressure", rank: 2 }],
  ["sea_water_temperature", { role: "seaTemperature" }],
  ["sea_surface_temperature", { role: "seaTemperature", rank: 1 }],
  ["sea_surface_subskin_temperature", { role: "seaTemperature", rank: 2 }],
  ["sea_surface_foundation_temperature", { role: "seaTemperature", rank: 2 }],
  ["sea_surface_skin_temperature", { role: "seaTemperature", rank: 3 }],
  ["surface_net_downward_shortwave_flux", { role: "shortwave", sense: "down", balance: "net" }],
  ["surface_net_upward_shortwave_flux", { role: "shortwave", sense: "up", balance: "net" }],
  ["net_downward_shortwave_flux_at_sea_water_surface", { role: "shortwave", sense: "down", balance: "net" }],
  ["surface_downwelling_shortwave_flux_in_air", { role: "shortwave", sense: "down", balance: "incoming" }],
  ["surface_downwelling_shortwave_flux", { role: "shortwave", sense: "down", balance: "incoming" }],
  ["surface_net_downward_longwave_flux", { role: "longwave", sense: "down", balance: "net" }],
  ["surface_net_upward_longwave_flux", { role: "longwave", sense: "up", balance: "net" }],
  ["surface_downwelling_longwave_flux_in_air", { role: "longwave", sense: "down", balance: "incoming" }],
  ["surface_downwelling_longwave_flux", { role: "longwave", sense: "down", balance: "incoming" }],
  ["surface_downward_sensible_heat_flux", { role: "sensible", sense: "down" }],
  ["surface_upward_sensible_heat_flux", { role: "sensible", sense: "up" }],
  ["surface_downward_latent_heat_flux", { role: "latent", sense: "down" }],
  ["surface_upward_latent_heat_flux", { role: "latent", sense: "up" }],
  ["surface_downward_heat_flux_in_sea_water", { role: "netHeat", sense: "down" }],
  ["surface_downward_heat_flux_in_air", { role: "netHeat", sense: "down", rank: 1 }],
  ["surface_upward_heat_flux_in_air", { role: "netHeat", sense: "up", rank: 1 }],
  ["upward_heat_flux_in_air", { role: "netHeat", sense: "up", rank: 1 }],
  ["lwe_water_evaporation_rate", { role: "evaporation", sense: "up" }],
  ["water_evaporation_flux", { role: "evaporation", sense: "up" }],
  ["water_evapotranspiration_flux", { role: "evaporation", sense: "up", rank: 1 }],
  ["lwe_thickness_of_water_evaporation_amount", { role: "evaporation", sense: "up" }],
  ["water_evaporation_amount", { role: "evaporation", sense: "up" }],
]);

/**
 * Short names of ECMWF's parameters, whose files often carry no standard name, or one whose sense is not the data's:
 * vertical fluxes are positive downwards there, evaporation and latent heat negative as a rule. Source: ECMWF parameter
 * database (pages of tp, e, slhf, sshf, ssr, str and the mean rates).
 */
export const FORECAST_CENTRE_NAMES: ReadonlyMap<string, Meaning> = new Map<string, Meaning>([
  ["u10", { role: "windU", height: 10 }],
  ["v10", { role: "windV", height: 10 }],
  ["u100", { role: "windU", height: 100 }],
  ["v100", { role: "windV", height: 100 }],
  ["si10", { role: "windSpeed", height: 10 }],
  ["wdir10", { role: "windFrom", height: 10 }],
  ["i10fg", { role: "windGust", height: 10 }],
  ["fg10", { role: "windGust", height: 10 }],
  ["t2m", { role: "airTemperature", height: 2 }],
  ["d2m", { role: "dewPoint", height: 2 }],
  ["sst", { role: "seaTemperature" }],
  ["msl", { role: "airPressure" }],
  ["sp", { role: "airPressure", rank: 1 }],
  ["tp", { role: "rain" }],
  ["mtpr", { role: "rain" }],
  ["avg_tprate", { role: "rain" }],
  ["e", { role: "evaporation", sense: "down" }],
  ["mer", { role: "evaporation", sense: "down" }],
  ["avg_ie", { role: "evaporation", sense: "down" }],
  ["ssr", { role: "shortwave", sense: "down", balance: "net" }],
  ["msnswrf", { role: "shortwave", sense: "down", balance: "net" }],
  ["avg_snswrf", { role: "shortwave", sense: "down", balance: "net" }],
  ["ssrd", { role: "shortwave", sense: "down", balance: "incoming" }],
  ["msdwswrf", { role: "shortwave", sense: "down", balance: "incoming" }],
  ["avg_sdswrf", { role: "shortwave", sense: "down", balance: "incoming" }],
  ["str", { role: "longwave", sense: "down", balance: "net" }],
  ["msnlwrf", { role: "longwave", sense: "down", balance: "net" }],
  ["avg_snlwrf", { role: "longwave", sense: "down", balance: "net" }],
  ["strd", { role: "longwave", sense: "down", balance: "incoming" }],
  ["msdwlwrf", { role: "longwave", sense: "down", balance: "incoming" }],
  ["avg_sdlwrf", { role: "longwave", sense: "down", balance: "incoming" }],
  ["sshf", { role: "sensible", sense: "down" }],
  ["msshf", { role: "sensible", sense: "down" }],
  ["avg_ishf", { role: "sensible", sense: "down" }],
  ["slhf", { role: "latent", sense: "down" }],
  ["mslhf", { role: "latent", sense: "down" }],
  ["avg_slhtf", { role: "latent", sense: "down" }],
]);
