export const roleWords: Record<string, string> = {
  artist: "artist",
  advisor: "science advisor",
  producer: "producer",
  client: "client",
};
