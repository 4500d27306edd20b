/** What scoring knows about the candidates of a round. Scoring provides it; the candidates' table asks. */
export abstract class CandidateBenefits {
  /** Points from 0 to 100 by candidate id. Empty until scoring has closed. */
  abstract byCandidate(roundId: string): Promise<Map<string, number>>;

  /** Ids of the candidates of which scores are missing, as far as the caller may see. */
  abstract withScoresMissing(roundId: string): Promise<Set<string>>;
}
