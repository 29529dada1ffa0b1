namespace DepthStress.Tests.Reading;

/// <summary>Spoils files in the ways that matter to a reader of tables.</summary>
internal static class FuzzBytes
{
    public static byte[] Spoil(byte[] bytes, Random random, int most)
    {
        ReadOnlySpan<byte> spices = "\0\r\n\t \",;:.~#-+eE0199xN\u00b5\u001b[]()"u8;
        var spoilt = bytes.ToList();
        for (var times = random.Next(1, most + 1); times > 0 && spoilt.Count > 0; times--)
        {
            var at = random.Next(spoilt.Count);
            var length = Math.Min(random.Next(1, 20), spoilt.Count - at);
            switch (random.Next(7))
            {
                case 0: spoilt[at] = (byte)random.Next(256); break;
                case 1: spoilt[at] = spices[random.Next(spices.Length)]; break;
                case 2: spoilt.Insert(at, spices[random.Next(spices.Length)]); break;
                case 3: spoilt.RemoveRange(at, length); break;
                case 4: spoilt.InsertRange(at, spoilt.GetRange(random.Next(spoilt.Count - length + 1), length)); break;
                case 5 when random.Next(4) == 0: spoilt.RemoveRange(at, spoilt.Count - at); break;
                default: spoilt.InsertRange(at, Enumerable.Repeat(spices[random.Next(spices.Length)], random.Next(1, 9))); break;
            }
        }

        return [.. spoilt];
    }
}
