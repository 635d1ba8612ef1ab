namespace BladeLog.Advice.Cuts;

/// <summary>What would help where nothing fits, in the order to try it.</summary>
public enum ProposalKind
{
    Stack,
    SharpenFirst,
    SlowerSpeed,
    ReliefCuts,
    Buy,
    ComesBack,
}

/// <summary>One proposal, reckoned like any other choice. A blade to buy has no tag yet.</summary>
public sealed record Proposal(ProposalKind Kind, string Sentence, Choice Outcome);
