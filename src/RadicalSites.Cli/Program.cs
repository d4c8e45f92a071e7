#pragma warning disable
return 0;
