import { Body, Container, Head, Hr, Html, Link, Preview, Text } from "@react-email/components";

export interface LetterProps {
  subject: string;
  paragraphs: string[];
  action?: { label: string; url: string };
  studioUrl: string;
}

// The desk's paper and ink. Web fonts do not travel by mail, so the serif is the reader's own.
const serif = "Georgia, 'Times New Roman', serif";
const sans = "'Helvetica Neue', Arial, sans-serif";
const prose = {
  fontFamily: serif,
  fontSize: "17px",
  lineHeight: "26px",
  color: "#1B1B1A",
  margin: "0 0 16px",
};
const small = { fontFamily: sans, fontSize: "13px", lineHeight: "18px", color: "#55554F", margin: "0 0 8px" };
const button = {
  fontFamily: sans,
  fontSize: "14px",
  lineHeight: "20px",
  display: "inline-block",
  backgroundColor: "#1B1B1A",
  color: "#EFEFEC",
  padding: "8px 16px",
  borderRadius: "1px",
  textDecoration: "none",
};

/** A letter as it looks: what happened, at most one thing to do, and who wrote. */
export function Letter({ subject, paragraphs, action, studioUrl }: LetterProps) {
  return (
    <Html lang="en">
      <Head>
        <title>{subject}</title>
      </Head>
      <Preview>{paragraphs[0]!}</Preview>
      <Body style={{ backgroundColor: "#EFEFEC", margin: 0, padding: "24px 0" }}>
        <Container style={{ maxWidth: "560px", padding: "0 24px" }}>
          <Text style={{ ...prose, margin: "0 0 24px" }}>Ringwright</Text>
          {paragraphs.map((paragraph) => (
            <Text key={paragraph} style={prose}>
              {paragraph}
            </Text>
          ))}
          {action && <Act {...action} />}
          <Hr style={{ borderColor: "#98988F", borderWidth: "1px 0 0", margin: "24px 0 12px" }} />
          <Text style={small}>
            Sent by Ringwright at{" "}
            <Link href={studioUrl} style={{ color: "#1B1B1A", textDecoration: "underline" }}>
              {studioUrl}
            </Link>
          </Text>
        </Container>
      </Body>
    </Html>
  );
}

function Act({ label, url }: { label: string; url: string }) {
  return (
    <>
      <Text style={{ margin: "24px 0 16px" }}>
        <Link href={url} style={button}>
          {label}
        </Link>
      </Text>
      <Text style={small}>Or copy this address: {url}</Text>
    </>
  );
}
