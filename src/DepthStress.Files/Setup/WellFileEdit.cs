namespace DepthStress.Files.Setup;

/// <summary>A value that is to be written into a well file.</summary>
/// <param name="Zone">Number of the zone from 0 that owns the section, or -1 for the well.</param>
/// <param name="Section">The section, such as "horizontal_stress"; a section inside one as "outer.inner".</param>
/// <param name="Key">The key.</param>
/// <param name="Value">The value as TOML text.</param>
public sealed record WellFileEdit(int Zone, string Section, string Key, string Value);
