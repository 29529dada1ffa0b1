using System.Text;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

/// <summary>
/// Spoilt files of every form. Each ends in a sound table or in an error with a position, in bounded room. The long run
/// (DEPTHSTRESS_LONG_FUZZ=1) takes other seeds and fifty times as many.
/// </summary>
public class LogFuzzTests
{
    private const int Short = 400;
    private const int Long = 20_000;
    private const string Head = "# c\n~V\nVERS. 2.0 :\nWRAP. NO :\n~W\nSTRT.m 1.5 :\nSTOP.m 3 :\nSTEP.m 0.5 :\nNULL. -999.25 :\nWELL. Bramble 7 : WELL\n~C\nDEPT.m : depth\nGR.gAPI :\nRDEP .ohm.m :\n~P\nBS.in 8.5 : bit\n~O\ntext\n~A\n";
    private const string Rows = "1.5 10 -999.25\n2.0 11.25 2.5\n2.5 11 2.6e0\n3 12 2.65\n";
    private static readonly bool IsLong = Environment.GetEnvironmentVariable("DEPTHSTRESS_LONG_FUZZ") == "1";
    private static readonly int Cases = IsLong ? Long : Short;

    [Theory]
    [InlineData("a.csv", "DEPT[m],GR (gAPI),\"RHOB\"\nm,gAPI,g/cm3\n1.5,10,-999.25\n2.0,11.25,2.5\n2.5,,2.6e0\n3,12,2.65\n", "utf-8")]
    [InlineData("a.csv", "logged: 2020, depth\nDEPT;GR;RHOB\nm;gAPI;g/cm3\n1,5;10;-999,25\n2,0;11,25;2,5\n2,5;;2,6\n3;12;2,65\n", "utf-8")]
    [InlineData("a.csv", "DEPT   GR  RHOB\n1.5  10  -999.25\n2.0 11.25 2.5\n2.5 ERR 2.6e0\n3 12 2.65\n", "utf-8")]
    [InlineData("a.csv", "DEPT\tGR\tRHOB\n3\t10\t-999.25\n2.5\t11.25\t2.5\n2.4\t\t2.6e0\n2\t12\t2.65\n", "utf-16")]
    [InlineData("a.csv", "DEPT,GR\n3,10\n2.5,11\n2.5,\n2.5,13\n2,12\n", "utf-8")]
    [InlineData("a.las", Head + Rows, "utf-8")]
    [InlineData("a.las", Head + Rows, "utf-16")]
    [InlineData("a.las", Head + "3 -999.25-999.25\n2.5 (null) 2.5\n2 11 --\n1 1.5 2\n", "utf-8")]
    [InlineData("a.las", "~V\nVERS. 2.0 :\nWRAP. YES :\n~W\nNULL. -999.25 :\n~C\nDEPT.m : depth\nGR.gAPI :\nRDEP .ohm.m :\nDT.us/m :\n~A\n1.5\n10 -999.25\n5\n2\n11.25 2.5\n5\n3\n12 2.65\n5\n", "utf-8")]
    [InlineData("a.las", "~Version\nVERS. 3.0:\nWRAP. NO:\nDLM. COMMA:\n~Well\nNULL. -999.25:\n~Log_Definition\nDEPT.m : depth {F}\nGR.gAPI :\n~Log_Data | Log_Definition\n1,10\n2,\n3,\"30\"\n~Tops_Data\nx,y\n", "utf-8")]
    [InlineData("a.las", "~V\nVERS. 1.2 :\nWRAP. NO :\n~W\nWELL. WELL : Bl\u00e5b\u00e6r\n~C\nDEPT.m :\nGR.gAPI :\nDEPTH_MD.ft :\n~A\n1,5\t10\t3\n2,5\t11\t4\n3\t12,25\t5\n", "iso-8859-1")]
    public void Spoilt_files_end_in_a_sound_table_or_in_an_error_with_a_position(string name, string text, string encoding)
    {
        var random = new Random(IsLong ? 4_711 : 20_260);
        var (read, refused) = (0, 0);
        var letters = Encoding.GetEncoding(encoding);
        var sound = letters.GetBytes(text);
        for (var n = 0; n < Cases; n++)
        {
            // A single fault often leaves a file that can be read, several seldom do.
            var most = n % 4 < 2 ? 1 : 4;

            // Odd bytes put UTF-16 out of step, which is soon refused: half of its cases are spoilt before they are encoded.
            var bytes = letters is UnicodeEncoding && n % 2 == 0
                ? letters.GetBytes(Encoding.Latin1.GetString(FuzzBytes.Spoil(Encoding.Latin1.GetBytes(text), random, most)))
                : FuzzBytes.Spoil(sound, random, most);
            var options = new LogReadOptions { RepeatedDepth = (RepeatedDepth)(n % 3) };
            var before = GC.GetAllocatedBytesForCurrentThread();
            var result = LogReading.Bytes(bytes, name, options);
            Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, (64L << 20) + (50L * bytes.Length));
            if (result.File is { } file)
            {
                read++;
                AssertSound(file);
            }
            else
            {
                refused++;
                AssertPlaced(result, name, bytes);
            }
        }

        // Both ends are reached, so that neither branch above is idle.
        Assert.InRange(read, Cases / 20, Cases);
        Assert.InRange(refused, Cases / 20, Cases);
    }

    private static void AssertSound(LogFile file)
    {
        Assert.All(file.Columns, c => Assert.Equal(file.Rows, c.Values.Length));
        Assert.All(file.Columns, c => Assert.Equal(c.Missing, c.Values.Count(double.IsNaN)));
        Assert.Equal(file.Columns.Count, file.Columns.Select(c => c.Name.ToUpperInvariant()).Distinct().Count());
        var depth = file.Columns[file.DepthColumn].Values;
        for (var i = 0; i < depth.Length; i++) Assert.True(i == 0 ? !double.IsNaN(depth[0]) : depth[i] > depth[i - 1]);
    }

    private static void AssertPlaced(LogReading result, string name, byte[] bytes)
    {
        var lines = 1 + Math.Max(bytes.Count(b => b is (byte)'\n'), bytes.Count(b => b is (byte)'\n' or (byte)'\r'));
        Assert.Contains(result.Bag.Items, d => d.Severity == Severity.Error);
        Assert.All(result.Bag.Items, d => Assert.Equal(name, d.Position.File));
        Assert.All(result.Bag.Items, d => Assert.InRange(d.Position.Line, 0, lines));
        Assert.DoesNotContain(result.Messages, m => m.Any(char.IsControl));
    }
}
